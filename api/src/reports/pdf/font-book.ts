import type { PDFContext } from 'pdf-lib';
import { FontFace, type SetText } from './font-face.ts';
import { characterNumber, printableText } from './printable-text.ts';
import { hasRightToLeft, textOrder } from './text-order.ts';

export type Weight = 'regular' | 'bold';

const ATKINSON = '@fontsource/atkinson-hyperlegible/files/atkinson-hyperlegible';
const DEJAVU = '@fontsource/dejavu-sans/files/dejavu-sans';
const UNIFONT = '@fontsource/unifontex/files/unifontex-latin-400-normal.woff';
const REPLACEMENT = 0x203a;
const PLAIN = /^[\x20-\x7e]*$/;
const BEYOND_ASCII = /[^\x20-\x7e]/gu;

/**
 * The fonts of a report and the choice among them for each character: Atkinson Hyperlegible, its extension for Central
 * Europe, DejaVu Sans for signs and other scripts, UnifontEX for the rest of Unicode. A character none of them has is set
 * as its number, `‹U+1F9EF›`; nothing is left out silently.
 */
export class FontBook {
  private readonly faces: Record<Weight, readonly FontFace[]>;
  private readonly glyphs: Record<Weight, Map<number, readonly SetText[]>> = { regular: new Map(), bold: new Map() };

  private constructor(faces: Record<Weight, readonly FontFace[]>) {
    this.faces = faces;
  }

  /** Loads the fonts; the largest one only when `sample` (all text that may be set) needs it. */
  static async load(context: PDFContext, sample: string): Promise<FontBook> {
    const load = (key: string, file: string, name: string) => FontFace.load(key, file, name, context);
    const faces = {
      regular: [
        await load('R', `${ATKINSON}-latin-400-normal.woff`, 'AtkinsonHyperlegible-Regular'),
        await load('RX', `${ATKINSON}-latin-ext-400-normal.woff`, 'AtkinsonHyperlegible-RegularExt'),
        await load('RD', `${DEJAVU}-latin-400-normal.woff`, 'DejaVuSans'),
      ],
      bold: [
        await load('B', `${ATKINSON}-latin-700-normal.woff`, 'AtkinsonHyperlegible-Bold'),
        await load('BX', `${ATKINSON}-latin-ext-700-normal.woff`, 'AtkinsonHyperlegible-BoldExt'),
        await load('BD', `${DEJAVU}-latin-700-normal.woff`, 'DejaVuSans-Bold'),
      ],
    };
    const rare = new Set(printableText(sample).match(/[^\x20-\x7e]/gu) ?? []);
    const covered = (weight: Weight, character: string) =>
      faces[weight].some((face) => face.has(character.codePointAt(0) ?? 0));
    if ([...rare].some((character) => !covered('regular', character) || !covered('bold', character))) {
      const unifont = await load('U', UNIFONT, 'UnifontEX');
      faces.regular.push(unifont);
      faces.bold.push(unifont);
    }
    return new FontBook(faces);
  }

  /** Text as it will be seen: {@link printableText}, and the number of every character that no font has. */
  printable(text: string): string {
    const line = printableText(text);
    if (PLAIN.test(line)) return line;
    return line.replace(BEYOND_ASCII, (character) => {
      const codePoint = character.codePointAt(0) ?? 0;
      return this.faces.regular.some((face) => face.has(codePoint)) ? character : characterNumber(codePoint);
    });
  }

  /** The glyphs of one line in the order they are drawn. */
  set(text: string, weight: Weight): SetText[] {
    const line = printableText(text);
    const glyphs: SetText[] = [];
    if (!hasRightToLeft(line)) {
      for (const character of line) glyphs.push(...this.glyph(character, weight));
      return glyphs;
    }
    for (const piece of textOrder(line)) {
      const shaping = piece.joined ? this.faceOf(piece.text, weight) : undefined;
      if (shaping !== undefined) glyphs.push(shaping.set(piece.text));
      else for (const character of piece.text) glyphs.push(...this.glyph(character, weight));
    }
    return glyphs;
  }

  /** Width of one line, in the unit of `size`. */
  width(text: string, size: number, weight: Weight): number {
    let sum = 0;
    for (const glyph of this.set(text, weight)) sum += glyph.advance;
    return (sum * size) / 1000;
  }

  async embed(context: PDFContext): Promise<void> {
    for (const face of new Set([...this.faces.regular, ...this.faces.bold])) await face.embed(context);
  }

  private faceOf(text: string, weight: Weight): FontFace | undefined {
    return this.faces[weight].find((face) => [...text].every((character) => face.has(character.codePointAt(0) ?? 0)));
  }

  private glyph(character: string, weight: Weight): readonly SetText[] {
    const codePoint = character.codePointAt(0) ?? 0;
    const known = this.glyphs[weight].get(codePoint);
    if (known !== undefined) return known;
    const face = this.faces[weight].find((candidate) => candidate.has(codePoint));
    const glyphs =
      face !== undefined || codePoint === REPLACEMENT
        ? [(face ?? this.firstFace(weight)).set(character)]
        : [...characterNumber(codePoint)].flatMap((part) => this.glyph(part, weight));
    this.glyphs[weight].set(codePoint, glyphs);
    return glyphs;
  }

  private firstFace(weight: Weight): FontFace {
    const face = this.faces[weight][0];
    if (face === undefined) throw new Error('The report has no fonts: the font packages are not installed.');
    return face;
  }
}
