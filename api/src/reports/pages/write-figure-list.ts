import type { Estimate } from '@embertally/shared/methods/estimate';
import type { Figures } from '../figures.ts';
import type { Flow } from '../layout/flow.ts';
import { HAIRLINE, INK, LEADING, RULE, SIZE, SOFT } from '../layout/theme.ts';
import { wrapText } from '../pdf/wrap-text.ts';
import type { RoomNotes } from './room-notes.ts';

const GUTTER = 22;

/** Named figures in two columns with hairlines; what could not be computed is left out here and named below. */
export function writeFigureList(
  flow: Flow,
  figures: Figures,
  notes: RoomNotes,
  list: readonly (readonly [name: string, estimate: Estimate | undefined])[],
): void {
  const known = list.flatMap(([name, estimate]) => (estimate === undefined ? [] : [{ name, estimate }]));
  const width = (flow.width - GUTTER) / 2;
  for (let at = 0; at < known.length; at += 2) {
    const pair = known.slice(at, at + 2).map(({ name, estimate }) => {
      const why = estimate.value === null && estimate.never !== undefined ? notes.marked([estimate.never]) : '';
      const value = `${figures.estimate(estimate)}${why}${notes.marks(estimate)}`;
      const lines = wrapText(flow.file.book, value, SIZE.body, 'regular', width * 0.5);
      return { names: wrapText(flow.file.book, name, SIZE.body, 'regular', width * 0.48), lines };
    });
    const leading = SIZE.body * LEADING;
    const tall = Math.max(...pair.map(({ names, lines }) => Math.max(names.length, lines.length)));
    flow.need(tall * leading + 5);
    for (const [column, { names, lines }] of pair.entries()) {
      const x = flow.left + column * (width + GUTTER);
      for (const [index, name] of names.entries()) {
        flow.sheet.text(name, x, flow.y + 2 + SIZE.body + index * leading, { size: SIZE.body, colour: SOFT });
      }
      for (const [index, line] of lines.entries()) {
        const y = flow.y + 2 + SIZE.body + index * leading;
        flow.sheet.text(line, x + width, y, { size: SIZE.body, colour: INK, align: 'right' });
      }
      flow.sheet.line(
        [
          [x, flow.y + tall * leading + 4],
          [x + width, flow.y + tall * leading + 4],
        ],
        { colour: RULE, width: HAIRLINE },
      );
    }
    flow.y += tall * leading + 4;
  }
}
