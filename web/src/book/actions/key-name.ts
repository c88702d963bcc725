export interface PressedKey {
  readonly key: string;
  readonly ctrlKey: boolean;
  readonly metaKey: boolean;
  readonly shiftKey: boolean;
  readonly altKey: boolean;
}

/** The name of a pressed key as actions write it: `Control+Shift+Z`. Command counts as Control. */
export function keyName(event: PressedKey): string {
  const letter = event.key.length === 1 ? event.key.toUpperCase() : event.key;
  // Shift is part of a sign such as ? already; of a letter or an arrow it is said.
  const shift = event.shiftKey && (event.key.length > 1 || /[a-z]/i.test(event.key));
  return [
    event.ctrlKey || event.metaKey ? 'Control' : null,
    shift ? 'Shift' : null,
    event.altKey ? 'Alt' : null,
    letter,
  ]
    .filter((part) => part !== null)
    .join('+');
}

/** A key as it is shown beside its verb: `Ctrl Z`, `⇧F`. */
export function keyLabel(name: string): string {
  return name
    .replace('Control+', 'Ctrl ')
    .replace('Shift+', '⇧')
    .replace('Delete', 'Del')
    .replace('Escape', 'Esc')
    .replace('Arrows', '← → ↑ ↓');
}
