import { readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import fontkit from '@pdf-lib/fontkit';
import { CustomFontSubsetEmbedder, type PDFContext, type PDFRef } from 'pdf-lib';
import { unpackWoff } from './unpack-woff.ts';

const packages = createRequire(import.meta.url);
/** Figures of equal width, so that columns of numbers line up. */
const FEATURES = { tnum: true, kern: false, liga: false };
const ARABIC = /\p{Script=Arabic}/u;

type ScriptLayout = (
  text: string,
  features: typeof FEATURES | undefined,
  script: string,
) => ReturnType<ReturnType<typeof fontkit.create>['layout']>;

/**
 * The font library, told the script instead of left to guess it: letters are set one by one, so only Arabic needs shaping,
 * and the library's shapers of some other scripts do not run at all.
 */
const letterByLetter: Parameters<typeof CustomFontSubsetEmbedder.for>[0] = {
  create(bytes) {
    const font = fontkit.create(bytes);
    // The third argument is there; the types leave it out.
    const layout = font.layout.bind(font) as ScriptLayout;
    return Object.assign(font, {
      layout: (text: string, features?: typeof FEATURES) => layout(text, features, ARABIC.test(text) ? 'arab' : 'latn'),
    });
  },
};

/** A glyph or a shaped run: what the page content says and how far the pen moves (in 1/1000 of the size). */
export interface SetText {
  readonly face: FontFace;
  readonly hex: string;
  readonly advance: number;
}

/**
 * One font file, embedded as the subset of the glyphs that were set. Only fonts from `.woff` files embedded as subsets
 * render; a `.woff2` or a whole file gives a page that extracts as text but prints blank.
 */
export class FontFace {
  readonly key: string;
  readonly ref: PDFRef;
  private used = false;
  private readonly embedder: CustomFontSubsetEmbedder;
  private readonly characters: ReadonlySet<number>;

  private constructor(key: string, ref: PDFRef, embedder: CustomFontSubsetEmbedder) {
    this.key = key;
    this.ref = ref;
    this.embedder = embedder;
    this.characters = new Set(embedder.font.characterSet);
  }

  static async load(key: string, file: string, name: string, context: PDFContext): Promise<FontFace> {
    const bytes = unpackWoff(await readFile(packages.resolve(file)));
    return new FontFace(
      key,
      context.nextRef(),
      await CustomFontSubsetEmbedder.for(letterByLetter, bytes, name, FEATURES),
    );
  }

  has(codePoint: number): boolean {
    return this.characters.has(codePoint);
  }

  set(text: string): SetText {
    this.used = true;
    const hex = this.embedder.encodeText(text).asString();
    return { face: this, hex, advance: this.embedder.widthOfTextAtSize(text, 1000) };
  }

  async embed(context: PDFContext): Promise<void> {
    if (this.used) await this.embedder.embedIntoContext(context, this.ref);
  }
}
