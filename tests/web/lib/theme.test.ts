import { setTheme, THEMES } from '@embertally/web/src/lib/theme.ts';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { runInThisContext } from 'node:vm';
import { afterEach, describe, expect, it, vi } from 'vitest';

const firstPaint = readFileSync(join(import.meta.dirname, '../../../web/public/first-paint.js'), 'utf8');

/** Runs the script of the page's head in this window. */
function paint(): string | undefined {
  delete document.documentElement.dataset.theme;
  runInThisContext(firstPaint);
  return document.documentElement.dataset.theme;
}

afterEach(() => vi.restoreAllMocks());

describe('the theme', () => {
  it.each(THEMES)('%s is put on before anything is drawn, as it was chosen', (theme) => {
    setTheme(theme);
    const chosen = document.documentElement.dataset.theme;
    expect(paint()).toBe(chosen);
    expect(chosen).toBe(theme === 'system' ? undefined : theme);
  });

  it('holds on this page where the browser forbids storage', () => {
    vi.spyOn(Storage.prototype, 'setItem').mockImplementation(() => {
      throw new DOMException('forbidden', 'SecurityError');
    });
    setTheme('dark');
    expect(document.documentElement.dataset.theme).toBe('dark');
  });

  it('is not taken from a value nobody can choose', () => {
    window.localStorage.setItem('embertally.theme', 'plaid');
    expect(paint()).toBeUndefined();
  });
});
