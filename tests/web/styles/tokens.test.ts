import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';

const css = readFileSync(join(import.meta.dirname, '../../../web/src/styles/tokens.css'), 'utf8');

/** The custom properties of the first block that follows a selector. */
function tokens(selector: string): Record<string, string> {
  const start = css.indexOf(selector);
  expect(start, selector).toBeGreaterThanOrEqual(0);
  const block = css.slice(css.indexOf('{', start + selector.length - 1) + 1, css.indexOf('}', start));
  const pairs = [...block.matchAll(/--([\w-]+):\s*([^;]+);/g)];
  return Object.fromEntries(pairs.map(([, name = '', value = '']) => [name, value] as const));
}

const light = tokens(':root {');
const dark = tokens(":root[data-theme='dark'] {");

function luminance(hex: string): number {
  const channel = (at: number) => {
    const value = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
    return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
  };
  return 0.2126 * channel(1) + 0.7152 * channel(3) + 0.0722 * channel(5);
}

/** WCAG 2.2, definition of contrast ratio. */
function contrast(a: string, b: string): number {
  const [high, low] = [luminance(a), luminance(b)].sort((x, y) => y - x) as [number, number];
  return (high + 0.05) / (low + 0.05);
}

describe('the colours', () => {
  it('are the same dark, followed or chosen', () => {
    expect(tokens(':root:not([data-theme]) {')).toEqual(dark);
  });

  describe.each([
    ['light', light],
    ['dark', dark],
  ])('%s', (_name, set) => {
    it.each(['ink', 'soft', 'verdigris', 'indigo', 'ochre', 'madder'])(
      '%s is readable on a page and on paper',
      (name) => {
        const colour = set[name] ?? '';
        expect(contrast(colour, set.page ?? '')).toBeGreaterThanOrEqual(4.5);
        expect(contrast(colour, set.paper ?? '')).toBeGreaterThanOrEqual(4.5);
      },
    );

    it('text on a primary action is readable', () => {
      expect(contrast(set['on-verdigris'] ?? '', set.verdigris ?? '')).toBeGreaterThanOrEqual(4.5);
    });
  });

  it('go from pale to deep with the load', () => {
    const bands = [0, 1, 2, 3, 4, 5].map((band) => luminance(light[`load-${band}`] ?? ''));
    expect(bands).toEqual(bands.toSorted((a, b) => b - a));
    expect(new Set(bands).size).toBe(6);
  });
});
