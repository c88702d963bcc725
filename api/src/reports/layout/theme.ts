import type { Colour } from '../pdf/sheet.ts';

function colour(hex: string): Colour {
  const channel = (from: number) => Number.parseInt(hex.slice(from, from + 2), 16) / 255;
  return [channel(1), channel(3), channel(5)];
}

/** Colours of the book on white paper; the same tokens as on screen. */
export const INK = colour('#1B2127');
export const SOFT = colour('#5A626B');
export const RULE = colour('#D9D2C1');
export const PAPER = colour('#F7F4EC');
export const PAGE = colour('#FFFFFF');
export const VERDIGRIS = colour('#1C6A66');
export const OCHRE = colour('#8A5A00');
export const MADDER = colour('#9B2335');
export const LOAD_COLOURS: readonly Colour[] = ['#F3EBCF', '#E7CF95', '#D7A35E', '#B86F45', '#8A4247', '#55284A'].map(
  colour,
);

/** Type sizes in points: 34, 26, 20, 16 and 14 px of the screen, then table and note sizes of a printed page. */
export const SIZE = { figure: 25.5, title: 19.5, heading: 13, lead: 11, body: 9.5, table: 8.5, note: 7.5 } as const;
/** Distance between baselines as a share of the size. */
export const LEADING = 1.36;

/** A4 in points, and the room left around the text. */
export const PAPER_SHORT = 595.28;
export const PAPER_LONG = 841.89;
export const MARGIN = { left: 56, right: 48, top: 64, bottom: 66 } as const;
export const HAIRLINE = 0.5;

export const POINTS_PER_METRE = 72 / 0.0254;

/** One colour laid over another with the given share of the first. */
export function mixed(over: Colour, under: Colour, share: number): Colour {
  const channel = (at: 0 | 1 | 2) => over[at] * share + under[at] * (1 - share);
  return [channel(0), channel(1), channel(2)];
}
