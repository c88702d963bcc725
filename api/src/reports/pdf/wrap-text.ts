import type { FontBook, Weight } from './font-book.ts';

/** A stretch that is not broken, with the spaces before it; no-break spaces are part of the word. */
const WORD = /[ \u2000-\u200a\u3000]*[^ \u2000-\u200a\u3000\-–—/·,;]*[-–—/·,;]?/gu;
const IDEOGRAPH = /[\u2e80-\u9fff\uac00-\ud7af\uf900-\ufaff\uff00-\uffef\u{20000}-\u{3ffff}]/u;
const LETTER = /[\p{L}\p{N}]/u;

/**
 * Lines of at most `width` (unit of `size`). Breaks at spaces and after hyphens and strokes; a word that is longer than a
 * line is broken where it must be, with a hyphen between letters. Every character of the text is on some line; only
 * spaces at a break are dropped. Always at least one line.
 */
export function wrapText(book: FontBook, text: string, size: number, weight: Weight, width: number): string[] {
  const line = book.printable(text);
  if (book.width(line, size, weight) <= width) return [line];
  const lines: string[] = [];
  let current = '';
  let used = 0;
  const endLine = () => {
    lines.push(current.trimEnd());
    current = '';
    used = 0;
  };
  const place = (word: string, wide: number) => {
    current += word;
    used += wide;
  };
  for (const piece of line.match(WORD) ?? []) {
    if (piece === '') continue;
    const wide = book.width(piece, size, weight);
    if (used + wide <= width) {
      place(piece, wide);
      continue;
    }
    const word = current === '' ? piece : piece.trimStart();
    const bare = book.width(word, size, weight);
    if (bare <= width && !IDEOGRAPH.test(word)) {
      if (current !== '') endLine();
      place(word, bare);
      continue;
    }
    if (current !== '' && !IDEOGRAPH.test(word)) endLine();
    else if (current !== '' && /^\s/u.test(piece)) place(' ', book.width(' ', size, weight));
    const hyphen = book.width('-', size, weight);
    const characters = [...word];
    for (const [at, character] of characters.entries()) {
      const advance = book.width(character, size, weight);
      const before = characters[at - 1] ?? '';
      const joins = LETTER.test(character) && LETTER.test(before) && !IDEOGRAPH.test(character);
      const room = joins || LETTER.test(character) ? width - hyphen : width;
      if (current !== '' && used + advance > room) {
        if (joins) current += '-';
        endLine();
      }
      place(character, advance);
    }
  }
  if (current.trim() !== '' || lines.length === 0) endLine();
  return lines;
}
