import type { Flow } from '../layout/flow.ts';
import { SIZE, SOFT } from '../layout/theme.ts';
import { writeHeading } from '../layout/write-heading.ts';
import { writeText } from '../layout/write-text.ts';
import type { ReportBook, RoomReport } from '../report-book.ts';
import type { RoomNotes } from './room-notes.ts';
import { writeFigureList } from './write-figure-list.ts';

/** What the air of the room can feed with everything shut, and how little it takes to lose sight in it. */
export function writeAir(flow: Flow, { figures }: ReportBook, { tally }: RoomReport, notes: RoomNotes): void {
  const { air } = tally;
  if (Object.keys(air).length === 0) return;
  writeHeading(flow, 'Smoke and air', 60);
  const text = 'As if every door and window were shut.';
  writeText(flow, text, { size: SIZE.table, colour: SOFT, after: 4 });
  writeFigureList(flow, figures, notes, [
    ['Heat the air can feed, down to 13 % oxygen', air.oxygenLimitedHeat],
    ['The air is used up after', air.oxygenEnd],
    ['The same heat down to 15 %', air.oxygenLimitedHeatAt15],
    ['The same heat down to 10 %', air.oxygenLimitedHeatAt10],
    ['Burnt until a sign is lost from sight at 10 m', air.massForVisibility10m],
    ['The same for a sign that shines', air.massForVisibility10mShining],
    ['Carbon monoxide when the oxygen ends the fire', air.carbonMonoxide],
    ['The same for a fire short of air', air.carbonMonoxideShortOfAir],
  ]);
  flow.gap(SIZE.heading);
}
