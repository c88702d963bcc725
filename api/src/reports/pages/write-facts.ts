import type { Flow } from '../layout/flow.ts';
import { HAIRLINE, INK, LEADING, RULE, SIZE, SOFT } from '../layout/theme.ts';
import { wrapText } from '../pdf/wrap-text.ts';

/** Name and value pairs, one line each with a hairline between them, as at the head of a ledger. */
export function writeFacts(
  flow: Flow,
  facts: readonly (readonly [name: string, value: string])[],
  nameWidth = 120,
): void {
  const leading = SIZE.body * LEADING;
  for (const [name, value] of facts) {
    const lines = wrapText(flow.file.book, value, SIZE.body, 'regular', flow.width - nameWidth);
    for (const [index, line] of lines.entries()) {
      flow.need(leading + 5);
      const base = flow.y + SIZE.body + 2;
      if (index === 0) flow.sheet.text(name, flow.left, base, { size: SIZE.body, colour: SOFT });
      flow.sheet.text(line, flow.left + nameWidth, base, { size: SIZE.body, colour: INK });
      flow.y += leading;
    }
    flow.y += 4;
    flow.sheet.line(
      [
        [flow.left, flow.y],
        [flow.right, flow.y],
      ],
      { colour: RULE, width: HAIRLINE },
    );
  }
}
