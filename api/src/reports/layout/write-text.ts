import { wrapText } from '../pdf/wrap-text.ts';
import type { Weight } from '../pdf/font-book.ts';
import type { Colour } from '../pdf/sheet.ts';
import type { Flow } from './flow.ts';
import { INK, LEADING, SIZE } from './theme.ts';

export interface TextBlock {
  readonly size?: number;
  readonly colour?: Colour;
  readonly weight?: Weight;
  /** From the left margin, in points. */
  readonly indent?: number;
  /** At most this wide; default the rest of the line. */
  readonly width?: number;
  /** Free height below, default none. */
  readonly after?: number;
}

/** A paragraph in the flow: wrapped, continued on the next page where it must be. Blank lines of the text stay. */
export function writeText(flow: Flow, text: string, block: TextBlock = {}): void {
  const size = block.size ?? SIZE.body;
  const weight = block.weight ?? 'regular';
  const indent = block.indent ?? 0;
  const style = { size, weight, colour: block.colour ?? INK };
  const leading = size * LEADING;
  for (const paragraph of text.split(/\r\n|\n|\r/)) {
    for (const line of wrapText(flow.file.book, paragraph, size, weight, block.width ?? flow.width - indent)) {
      flow.need(leading);
      flow.sheet.text(line, flow.left + indent, flow.y + size, style);
      flow.y += leading;
    }
  }
  flow.gap(block.after ?? 0);
}
