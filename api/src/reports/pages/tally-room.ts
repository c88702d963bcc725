import type { Flow } from '../layout/flow.ts';
import { SIZE, SOFT } from '../layout/theme.ts';
import { writeHeading } from '../layout/write-heading.ts';
import { writeTable, type TableRow } from '../layout/write-table.ts';
import { writeText } from '../layout/write-text.ts';
import type { ReportBook, RoomReport } from '../report-book.ts';
import { FLASHOVER_NAMES } from './lowest-flashover.ts';
import type { RoomNotes } from './room-notes.ts';
import { typeset } from './typeset.ts';
import { writeFigureList } from './write-figure-list.ts';

const REGIMES: Readonly<Record<RoomReport['tally']['room']['regime'], string>> = {
  compartment: 'An ordinary compartment: the methods for rooms apply.',
  large: 'A large room (over 500 m² or over 6 m high): flashover and burn-out methods for rooms do not apply.',
  closed: 'A closed room: its openings cannot feed a fire that would flash it over.',
};

/** Openings, flashover by three ways side by side, hot layer. */
export function writeRoomFigures(flow: Flow, { figures }: ReportBook, { tally }: RoomReport, notes: RoomNotes): void {
  const { room } = tally;
  writeHeading(flow, 'What the room does');
  writeText(flow, REGIMES[room.regime], { after: 4 });
  const rows = (['thomas', 'babrauskas', 'mqh'] as const).flatMap((way): TableRow[] => {
    const criterion = room.flashover[way];
    if (criterion === undefined) return [];
    return [
      {
        cells: [
          FLASHOVER_NAMES[way],
          `${figures.estimate(criterion)}${notes.marks(criterion)}`,
          typeset(criterion.range),
          criterion.applicable ? 'applies' : `does not apply: ${typeset(criterion.why ?? 'outside its range')}`,
        ],
      },
    ];
  });
  if (rows.length > 0) {
    const columns = [
      { title: 'Flashover by', width: 118 },
      { title: 'Heat release needed', width: 76, align: 'right' as const },
      { title: 'Range it was tested in', width: { share: 1 } },
      { title: 'This room', width: { share: 0.9 } },
    ];
    writeTable(flow, columns, rows);
    flow.gap(4);
    const why =
      'The three differ because they rest on different tests and count losses to the linings differently; the lowest that applies is used.';
    writeText(flow, why, { size: SIZE.table, colour: SOFT, after: 6 });
  }
  writeFigureList(flow, figures, notes, [
    ['Time to flashover', room.flashover.time],
    ['Rise of the hot layer', room.hotLayer],
    ['Heat the open openings can feed', room.ventilationLimit],
    ['The same once the glass has gone', room.ventilationLimitAfterGlass],
    ['Opening factor, open openings', room.openingFactor],
    ['The same once the glass has gone', room.openingFactorAfterGlass],
    ['Area of all enclosing surfaces', room.enclosingArea],
    ['Volume of the room', room.volume],
  ]);
  flow.gap(SIZE.heading);
}
