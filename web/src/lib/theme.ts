import { useSyncExternalStore } from 'react';
import { createValue } from './create-value.ts';

/** `system` follows the device; `field` is black on white and larger, for daylight. */
export const THEMES = ['system', 'light', 'dark', 'field'] as const;
export type Theme = (typeof THEMES)[number];

/** Also read by public/first-paint.js, before anything is drawn. */
const KEY = 'embertally.theme';

function isTheme(value: string | null): value is Theme {
  return (THEMES as readonly (string | null)[]).includes(value);
}

function readTheme(): Theme {
  try {
    const stored = window.localStorage.getItem(KEY);
    return isTheme(stored) ? stored : 'system';
  } catch {
    // Storage is forbidden in this browser: the system's theme is the honest answer.
    return 'system';
  }
}

const theme = createValue<Theme>(readTheme());

/** Chooses the theme on this device. Where storage is forbidden the choice holds until the page is left. */
export function setTheme(next: Theme): void {
  if (next === 'system') delete document.documentElement.dataset.theme;
  else document.documentElement.dataset.theme = next;
  try {
    window.localStorage.setItem(KEY, next);
  } catch {
    // The choice still holds on this page; there is nowhere to keep it.
  }
  theme.set(next);
}

export function useTheme(): Theme {
  return useSyncExternalStore(theme.subscribe, theme.get);
}
