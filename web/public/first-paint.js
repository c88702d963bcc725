/* global document, localStorage */
// Puts the chosen theme on the page before anything is drawn, so that a dark room never sees a white flash.
// The key and the values are those of src/lib/theme.ts.
try {
  const theme = localStorage.getItem('embertally.theme');
  if (['light', 'dark', 'field'].includes(theme)) document.documentElement.dataset.theme = theme;
} catch {
  // The browser forbids storage: the page follows the system.
}
