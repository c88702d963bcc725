import type { Flow } from '../layout/flow.ts';
import { INK, LEADING, LOAD_COLOURS, PAGE, SIZE, SOFT } from '../layout/theme.ts';
import { writeHeading } from '../layout/write-heading.ts';
import { writeText } from '../layout/write-text.ts';
import { wrapText } from '../pdf/wrap-text.ts';
import type { ReportBook, RoomReport } from '../report-book.ts';
import type { RoomNotes } from './room-notes.ts';

const LISTED = 7;
const NAME_WIDTH = 150;
const FIGURE_WIDTH = 84;

/** Bars of heat by material, the most first, then how much of it is fixed, stored and passing. */
export function writeMadeOf(flow: Flow, { figures }: ReportBook, { tally }: RoomReport, notes: RoomNotes): void {
  writeHeading(flow, 'What it is made of');
  const { load } = tally;
  const rows = load.byMaterial
    .map(({ label, heat }) => ({ label, heat: heat.value ?? 0 }))
    .filter(({ heat }) => heat > 0)
    .sort((a, b) => b.heat - a.heat);
  if (rows.length === 0) {
    const why =
      load.byEntry.length === 0 ? 'Nothing has been recorded in this room.' : 'Nothing recorded here gives heat.';
    writeText(flow, why, { colour: SOFT, after: 10 });
    return;
  }
  const listed = rows.length > LISTED + 1 ? rows.slice(0, LISTED) : rows;
  const rest = rows.slice(listed.length);
  const bars = [...listed];
  if (rest.length > 0) {
    bars.push({ label: `${rest.length} other materials`, heat: rest.reduce((sum, { heat }) => sum + heat, 0) });
  }
  const most = Math.max(...bars.map(({ heat }) => heat));
  const leading = SIZE.body * LEADING + 1.5;
  for (const { label, heat } of bars) {
    const lines = wrapText(flow.file.book, label, SIZE.body, 'regular', NAME_WIDTH - 8);
    flow.need(lines.length * leading);
    const base = flow.y + SIZE.body;
    const barWidth = flow.width - NAME_WIDTH - FIGURE_WIDTH;
    flow.sheet.rect(flow.left + NAME_WIDTH, base - 7.5, Math.max(0.8, (heat / most) * barWidth), 7.5, {
      fill: LOAD_COLOURS[3] ?? PAGE,
    });
    flow.sheet.text(figures.quantity(heat, 'MJ'), flow.right, base, { size: SIZE.body, colour: INK, align: 'right' });
    for (const line of lines) {
      flow.sheet.text(line, flow.left, flow.y + SIZE.body, { size: SIZE.body, colour: INK });
      flow.y += leading;
    }
  }
  flow.gap(5);
  const kept = (['fixed', 'stored', 'passing'] as const)
    .filter((keeping) => (load[keeping].value ?? 0) > 0)
    .map((keeping) => `${keeping} ${figures.estimate(load[keeping])}`);
  const peak =
    load.localPeak?.value == null
      ? ''
      : ` The fullest 2 m × 2 m hold ${figures.estimate(load.localPeak)}${notes.marks(load.localPeak)}.`;
  const place =
    load.placeAmongUse?.value == null
      ? ''
      : ` Among rooms of its use: ${figures.estimate(load.placeAmongUse)} of them hold less${notes.marks(load.placeAmongUse)}.`;
  writeText(flow, `Of it ${kept.join(', ')}.${peak}${place}`, { size: SIZE.table, colour: SOFT, after: 12 });
}
