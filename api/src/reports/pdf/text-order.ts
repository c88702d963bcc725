import { createRequire } from 'node:module';
import type { Bidi } from 'bidi-js';

const RIGHT_TO_LEFT = /[\u0590-\u08ff\ufb1d-\ufdff\ufe70-\ufeff\u{10800}-\u{10fff}\u{1e800}-\u{1efff}]/u;
const JOINING = /[\u0600-\u06ff\u0750-\u077f\u08a0-\u08ff]/u;
/** The package is CommonJS and its types describe an ES module; loaded as what it is. */
const makeBidi = createRequire(import.meta.url)('bidi-js') as () => Bidi;
const bidi = makeBidi();

/** A piece of a line in the order it is read from left to right; `joined` pieces are shaped as one, in their own order. */
export interface TextPiece {
  readonly text: string;
  readonly joined: boolean;
}

/** True when a line holds right-to-left script and {@link textOrder} has work to do. */
export function hasRightToLeft(text: string): boolean {
  return RIGHT_TO_LEFT.test(text);
}

/**
 * The pieces of one line from left to right, by the Unicode bidirectional algorithm with the direction of the line's own
 * first letter. Arabic letters that stand together stay together, because their shapes depend on their neighbours.
 */
export function textOrder(line: string): TextPiece[] {
  const levels = bidi.getEmbeddingLevels(line, 'auto');
  const order = bidi.getReorderedIndices(line, levels);
  const mirrored = bidi.getMirroredCharactersMap(line, levels.levels);
  const pieces: TextPiece[] = [];
  let joined = '';
  const endJoined = () => {
    if (joined !== '') pieces.push({ text: joined, joined: true });
    joined = '';
  };
  for (let at = 0; at < order.length; at++) {
    const index = order[at] ?? 0;
    const unit = line.charAt(index);
    if (JOINING.test(unit)) {
      joined = unit + joined;
      continue;
    }
    endJoined();
    const previous = index > 0 && order[at + 1] === index - 1 ? line.slice(index - 1, index + 1) : '';
    if (previous.length === 2 && (previous.codePointAt(0) ?? 0) > 0xffff) {
      pieces.push({ text: previous, joined: false });
      at++;
      continue;
    }
    const next = order[at + 1] === index + 1 ? line.slice(index, index + 2) : '';
    if (next.length === 2 && (next.codePointAt(0) ?? 0) > 0xffff) {
      pieces.push({ text: next, joined: false });
      at++;
      continue;
    }
    pieces.push({ text: mirrored.get(index) ?? unit, joined: false });
  }
  endJoined();
  return pieces;
}
