import { standingSentence } from '@embertally/shared/limits/standing-sentence';
import { drawBand } from '../layout/draw-band.ts';
import { drawStanding } from '../layout/draw-standing.ts';
import type { Flow } from '../layout/flow.ts';
import { INK, LEADING, SIZE, SOFT } from '../layout/theme.ts';
import { drawRule } from '../layout/write-heading.ts';
import { writeText } from '../layout/write-text.ts';
import { wrapText } from '../pdf/wrap-text.ts';
import type { ReportBook, RoomReport } from '../report-book.ts';
import type { RoomNotes } from './room-notes.ts';

const BAND_FROM = 190;
const WORD_WIDTH = 62;

/** The density with its band and limits, then how the room stands against each limit. */
export function writeHeadline(flow: Flow, report: ReportBook, room: RoomReport, notes: RoomNotes): void {
  const { figures } = report;
  const { book } = flow.file;
  const { load, limits } = room.tally;
  const density = load.perFloor;
  if (density?.value == null) {
    writeText(flow, 'The fire load density could not be computed; what is missing is named below.', { after: 8 });
  } else {
    const base = flow.y + SIZE.figure + 6;
    const { text, unit } = figures.parts(density.value, density.unit);
    const wide = flow.sheet.text(text, flow.left, base, { size: SIZE.figure, weight: 'bold', colour: INK });
    flow.sheet.text(`${unit}${notes.marks(density)}`, flow.left + wide + 8, base, { size: SIZE.heading, colour: SOFT });
    flow.sheet.text('kept on each unit of floor', flow.left, base + 14, { size: SIZE.note, colour: SOFT });
    const { band } = load;
    const bounds = limits.filter(({ quantity }) => quantity === 'load_per_floor_MJ_m2').map(({ bound }) => bound);
    drawBand(flow.sheet, book, flow.left + BAND_FROM, flow.y + 24, flow.width - BAND_FROM, {
      value: density.value,
      limits: bounds,
      figure: (value) => figures.bare(value, 'MJ/m2'),
      ...(band?.p5.value == null ? {} : { low: band.p5.value }),
      ...(band?.p95.value == null ? {} : { high: band.p95.value }),
    });
    flow.y = base + 24;
    if (band?.p5.value != null && band.p95.value != null) {
      const range = `${figures.bare(band.p5.value, 'MJ/m2')} to ${figures.quantity(band.p95.value, 'MJ/m2')}`;
      const sure = `From ${range} with 90 % probability, from how each amount was known and the spread of each heat, ${howFound(room)}${notes.marks(band.p5)}.`;
      writeText(flow, sure, { size: SIZE.table, colour: SOFT, after: 4 });
    }
  }
  if (limits.length === 0) writeText(flow, 'No limit is set for this room.', { colour: SOFT });
  for (const [index, stood] of limits.entries()) {
    const sentence = standingSentence(stood, room.limits[index], (value, unit) => figures.parts(value, unit));
    const lines = wrapText(book, sentence, SIZE.body, 'regular', flow.width - WORD_WIDTH);
    const leading = SIZE.body * LEADING;
    flow.need(Math.min(lines.length, 4) * leading + 5);
    drawStanding(flow.sheet, book, stood.standing, flow.left, flow.y + SIZE.body + 2, SIZE.body);
    for (const line of lines) {
      flow.need(leading);
      flow.sheet.text(line, flow.left + WORD_WIDTH, flow.y + SIZE.body + 2, { size: SIZE.body, colour: INK });
      flow.y += leading;
    }
    flow.gap(6);
  }
  flow.gap(6);
  drawRule(flow);
  flow.gap(14);
}

/** Which of the two bands it is. */
function howFound({ tally: { uncertainty } }: RoomReport): string {
  return uncertainty === undefined ? 'to first order' : `from ${uncertainty.samples} samples, seed ${uncertainty.seed}`;
}
