import { ChoiceField } from '../../components/choice-field.tsx';
import { setTheme, useTheme, type Theme } from '../../lib/theme.ts';

const CHOICES: readonly { readonly value: Theme; readonly label: string; readonly hint?: string }[] = [
  { value: 'system', label: 'As this device is set' },
  { value: 'light', label: 'Light' },
  { value: 'dark', label: 'Dark' },
  { value: 'field', label: 'Field', hint: 'Black on white and larger, to be read in daylight.' },
];

/** How the book looks on this device. Takes effect at once. */
export function ThemeChoice() {
  return <ChoiceField legend="How it looks" value={useTheme()} choices={CHOICES} onChange={setTheme} />;
}
