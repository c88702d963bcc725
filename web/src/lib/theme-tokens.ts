import { useSyncExternalStore } from 'react';
import { createValue } from './create-value.ts';

/** Rises each time the colours on screen may have changed, by choice or because the device turned dark. */
const revision = createValue(0);

function watch(): void {
  const rise = () => revision.set(revision.get() + 1);
  new MutationObserver(rise).observe(document.documentElement, { attributes: true, attributeFilter: ['data-theme'] });
  window.matchMedia('(prefers-color-scheme: dark)').addEventListener('change', rise);
}

let watching = false;
function subscribe(listener: () => void): () => void {
  if (!watching) {
    watching = true;
    watch();
  }
  return revision.subscribe(listener);
}

/** The colour a token of tokens.css has now, for things drawn outside CSS (canvas, charts). `name` without dashes. */
export function readToken(name: string): string {
  return getComputedStyle(document.documentElement).getPropertyValue(`--${name}`).trim();
}

/** Renders again when the theme changes; the number is only a key for memoised colours. */
export function useThemeRevision(): number {
  return useSyncExternalStore(subscribe, revision.get);
}
