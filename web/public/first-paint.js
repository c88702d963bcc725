// Puts the chosen theme on the page before anything is drawn, so that a dark room never sees a white flash.
// The key and the values are those of src/lib/theme.ts; a browser that forbids storage follows the system.
(function () {
  try {
    var theme = window.localStorage.getItem('embertally.theme');
    if (theme === 'light' || theme === 'dark' || theme === 'field') document.documentElement.dataset.theme = theme;
  } catch (error) {
    delete document.documentElement.dataset.theme;
  }
})();
