import fc from 'fast-check';
import { PDFDocument } from 'pdf-lib';
import { beforeAll, describe, expect, it } from 'vitest';
import { FontBook } from '../../../../api/src/reports/pdf/font-book.ts';
import { wrapText } from '../../../../api/src/reports/pdf/wrap-text.ts';

let book: FontBook;
beforeAll(async () => {
  const document = await PDFDocument.create();
  book = await FontBook.load(document.context, '日😀');
});

describe('wrapText', () => {
  it('breaks at spaces', () => {
    expect(wrapText(book, 'timber flats and pallets', 10, 'regular', 60)).toEqual(['timber flats', 'and pallets']);
  });

  it('breaks a word that is longer than a line with a hyphen', () => {
    const lines = wrapText(book, 'Donaudampfschifffahrtsgesellschaft', 10, 'regular', 60);
    expect(lines.length).toBeGreaterThan(2);
    expect(lines.slice(0, -1).every((line) => line.endsWith('-'))).toBe(true);
    expect(lines.map((line) => line.replace(/-$/, '')).join('')).toBe('Donaudampfschifffahrtsgesellschaft');
  });

  it('keeps a figure and its thin spaces on one line', () => {
    const figure = '58\u202f752\u202f000';
    expect(wrapText(book, `heat ${figure} MJ`, 10, 'regular', 66)).toEqual(['heat', figure, 'MJ']);
  });

  it('gives one empty line for no text', () => {
    expect(wrapText(book, '', 10, 'regular', 60)).toEqual(['']);
  });

  it('loses no character and keeps every line within the width, for any text', () => {
    const texts = fc.oneof(fc.string({ unit: 'grapheme', maxLength: 120 }), fc.string({ maxLength: 120 }));
    fc.assert(
      fc.property(texts, fc.integer({ min: 40, max: 300 }), (text, width) => {
        const lines = wrapText(book, text, 10, 'regular', width);
        const bare = (some: string) => some.replace(/[\s-]/g, '');
        expect(bare(lines.join(''))).toBe(bare(book.printable(text)));
        for (const line of lines) expect(book.width(line, 10, 'regular')).toBeLessThanOrEqual(width + 1e-6);
      }),
    );
  });
});
