import type { FontBook } from '../pdf/font-book.ts';
import type { Sheet } from '../pdf/sheet.ts';
import { INK, LOAD_COLOURS, OCHRE, PAGE, mixed, SIZE, SOFT } from './theme.ts';

export interface BandFigures {
  readonly value: number;
  readonly low?: number;
  readonly high?: number;
  readonly limits: readonly number[];
  readonly figure: (value: number) => string;
}

/** The value on a line from 0, its 5–95 % band as a box, each limit as a dashed mark with its figure. */
export function drawBand(sheet: Sheet, book: FontBook, x: number, y: number, width: number, band: BandFigures): void {
  const most = Math.max(band.value, band.high ?? 0, ...band.limits) * 1.12;
  if (!(most > 0)) return;
  const at = (value: number) => x + (value / most) * width;
  const size = SIZE.note;
  sheet.line(
    [
      [x, y],
      [x + width, y],
    ],
    { colour: SOFT, width: 0.7 },
  );
  for (const end of [0, width]) {
    sheet.line(
      [
        [x + end, y - 3],
        [x + end, y + 3],
      ],
      { colour: SOFT, width: 0.7 },
    );
  }
  const tint = mixed(LOAD_COLOURS[2] ?? PAGE, PAGE, 0.35);
  if (band.low !== undefined && band.high !== undefined) {
    sheet.rect(at(band.low), y - 8, at(band.high) - at(band.low), 16, {
      fill: tint,
      stroke: { colour: SOFT, width: 0.6 },
    });
    const [low, high] = [band.figure(band.low), band.figure(band.high)];
    const apart = at(band.high) - at(band.low) > book.width(low + high, size, 'regular') / 2 + 6;
    if (apart) {
      sheet.text(low, at(band.low), y + 18, { size, colour: SOFT, align: 'centre' });
      sheet.text(high, at(band.high), y + 18, { size, colour: SOFT, align: 'centre' });
    } else {
      sheet.text(`${low} – ${high}`, (at(band.low) + at(band.high)) / 2, y + 18, {
        size,
        colour: SOFT,
        align: 'centre',
      });
    }
  }
  sheet.line(
    [
      [at(band.value), y - 11],
      [at(band.value), y + 11],
    ],
    { colour: INK, width: 2 },
  );
  let free = -Infinity;
  for (const limit of [...band.limits].sort((a, b) => a - b)) {
    sheet.line(
      [
        [at(limit), y - 14],
        [at(limit), y + 11],
      ],
      { colour: OCHRE, width: 1, dash: [2.4, 1.6] },
    );
    const label = `limit ${band.figure(limit)}`;
    const wide = book.width(label, size, 'regular');
    const left = Math.min(at(limit) - wide / 2, x + width - wide);
    if (left < free) continue;
    sheet.text(label, left, y - 17, { size, colour: OCHRE });
    free = left + wide + 4;
  }
}
