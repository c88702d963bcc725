import { describe, expect, it } from 'vitest';
import { makeReport } from '../../../api/src/reports/make-report.ts';
import { PdfFile } from '../../../api/src/reports/pdf/pdf-file.ts';
import { inkShare, pageImages, pageTexts, pdfFacts } from '../../support/poppler.ts';
import { box, crate, groundFloor, uid, withEntries, withRoom } from '../../support/survey-builder.ts';
import { sampleInput } from './sample-report.ts';

const INK = [0, 0, 0] as const;

/** A page with one line of text, as it reads and as it looks. */
async function line(text: string) {
  const file = await PdfFile.create(text);
  file.addSheet(500, 40).text(text, 10, 26, { size: 16, colour: INK });
  const pdf = await file.finish({ title: 'line', author: 'us', subject: '', made: new Date(0) });
  return { text: pageTexts(pdf)[0]?.trim() ?? '', image: pageImages(pdf, 100)[0] };
}

describe('text that people type', () => {
  it.each([
    ['Latin of Central Europe', 'ő Ł ż ă İ'],
    ['signs of mathematics', '≤ √ σ Ω − × ½ ° ∞ ⁻¹'],
    ['Greek and Cyrillic', 'Ωμέγα Склад'],
    ['Japanese, Chinese, Korean', '日本 仓库 창고'],
    ['emoji', '😀 🔥'],
    ['Hebrew', 'שלום'],
    ['scripts that need shapers of their own', 'ⴰⵣⵓⵍ ᠮᠣᠩ ሰላም ไทย नमस् ខ្មែ'],
  ])('%s prints with a glyph for every letter and reads back the same', async (_, typed) => {
    const printed = await line(typed);
    // The reader guesses spaces from gaps and adds marks of direction; the letters are what counts.
    const letters = (text: string) => text.replace(/[\s\u200e\u200f\u202a-\u202e\u2066-\u2069]/gu, '').normalize('NFC');
    expect(letters(printed.text)).toBe(letters(typed));
    expect(printed.image && inkShare(printed.image)).toBeGreaterThan(0.005);
  });

  it('never leaves a box: any character has a glyph or prints as its number', async () => {
    const step = 61;
    const characters = Array.from({ length: Math.floor(0x1ffff / step) }, (_, index) => (index + 1) * step)
      .filter((codePoint) => codePoint < 0xd800 || codePoint > 0xdfff)
      .map((codePoint) => String.fromCodePoint(codePoint));
    const { book } = await PdfFile.create(characters.join(''));
    const missing = '0000';
    for (const character of characters) {
      for (const { hex } of book.set(character, 'bold')) {
        expect(hex.startsWith(missing), `U+${character.codePointAt(0)?.toString(16)}`).toBe(false);
      }
    }
  });

  it('joins Arabic letters: the word is narrower than its letters apart', async () => {
    const file = await PdfFile.create('مرحبا');
    const apart = [...'مرحبا'].reduce((sum, letter) => sum + file.book.width(letter, 10, 'regular'), 0);
    expect(file.book.width('مرحبا', 10, 'regular')).toBeLessThan(apart);
  });

  it('sets right-to-left words from the right and mirrors their brackets', async () => {
    const file = await PdfFile.create('');
    const order = (text: string) => file.book.set(text, 'regular').map(({ hex }) => hex);
    expect(order('אבג')).toEqual(order('א').concat(order('ב'), order('ג')).reverse());
    expect(order('(א)')).toEqual([...order('('), ...order('א'), ...order(')')]);
  });

  it.each([
    ['a mark that reorders text', 'exit\u202Egnp', 'exit‹U+202E›gnp'],
    ['NUL', 'a\u0000b', 'a‹U+0000›b'],
    ['half of a pair', 'a\ud83db', 'a‹U+D83D›b'],
    ['a character that no font has', 'a\u{12000}b', 'a‹U+12000›b'],
  ])('%s prints as its number', async (_, typed, expected) => {
    expect((await line(typed)).text).toBe(expected);
  });
});

describe('a report of odd names', () => {
  const odd = 'ő Ł ≤ √ σ Ω 日 😀 − \u202E\u0000';
  const seen = 'ő Ł ≤ √ σ Ω 日 😀 − ‹U+202E›‹U+0000›';

  it('prints them all, however long, and cuts none', async () => {
    const room = `<script>alert(1)</script> ${'Saal'.repeat(40)}`;
    let document = withRoom(groundFloor(), 'a', box(0, 0, 6, 4), { name: room });
    document = withEntries(document, crate('label', 'a', 2, 2), crate('other', 'a', 4, 2));
    const input = sampleInput(document, { site: odd, building: odd, made_by: odd, limits: [] });
    const entries = input.document.entries.map((entry) =>
      entry.id === uid('label') ? { ...entry, label: 'Z'.repeat(10_000) } : entry,
    );
    const pdf = await makeReport({ ...input, document: { ...input.document, entries } });
    const pages = pageTexts(pdf);
    const text = pages.join('').replace(/\s+/gu, ' ');
    expect(text).toContain(seen);
    expect(text.replace(/[ -]/gu, '')).toContain(room.replace(/[ -]/gu, ''));
    const ledger = pages.filter((page) => page.includes('Tally ·') || page.includes('Heat, MJ'));
    const letters =
      ledger
        .filter((page) => page.includes('Running'))
        // What comes after the ledger names the entry again, shortened.
        .map((page) => page.split('How sure')[0])
        .join('')
        .match(/Z/gu) ?? [];
    expect(letters).toHaveLength(10_000);
    expect(pdfFacts(pdf).get('Title')).toContain('‹U+202E›');
  });
});
