import { describe, expect, it } from 'vitest';
import { printableText } from '../../../../api/src/reports/pdf/printable-text.ts';

describe('printableText', () => {
  it.each([
    ['plain text stays', 'Scenery dock, 12 × 8 m', 'Scenery dock, 12 × 8 m'],
    ['letters of any script stay', 'ő Ł ≤ √ σ Ω 日 😀 שלום', 'ő Ł ≤ √ σ Ω 日 😀 שלום'],
    ['a base and its mark become one letter', 'e\u0301', 'é'],
    ['a mark that reorders text is shown, not obeyed', 'a\u202Eb', 'a‹U+202E›b'],
    ['NUL is shown', 'a\u0000b', 'a‹U+0000›b'],
    ['half of a pair is shown', 'a\ud800b', 'a‹U+D800›b'],
    ['a private character is shown', '\ue000', '‹U+E000›'],
    ['line breaks and tabs become spaces', 'a\r\nb\tc\nd', 'a b c d'],
    ['joiners and soft hyphens have no form', 'a\u00adb\u200dc\ufe0f', 'abc'],
  ])('%s', (_, text, expected) => {
    expect(printableText(text)).toBe(expected);
  });
});
