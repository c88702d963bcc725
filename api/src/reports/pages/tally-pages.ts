import { useByKey } from '@embertally/shared/catalogue/uses';
import type { Flow } from '../layout/flow.ts';
import { SIZE, VERDIGRIS } from '../layout/theme.ts';
import { writeTitle } from '../layout/write-heading.ts';
import type { Sheet } from '../pdf/sheet.ts';
import type { ReportBook, RoomReport } from '../report-book.ts';
import { RoomNotes } from './room-notes.ts';
import { writeAir } from './tally-air.ts';
import { writeBurnout } from './tally-burnout.ts';
import { writeCurve } from './tally-curve.ts';
import { writeHeadline } from './tally-headline.ts';
import { writeLedger } from './tally-ledger.ts';
import { writeMadeOf } from './tally-made-of.ts';
import { writeCautionTitles, writeMissing, writeNotes } from './tally-notes.ts';
import { writeResponse } from './tally-response.ts';
import { writeRoomFigures } from './tally-room.ts';
import { writeSure } from './tally-sure.ts';
import { writeSpread } from './tally-spread.ts';

/**
 * The tally of one room, read from top to bottom as an argument: how much, of what, how fast, when it would be
 * noticed, what the room does with it, what sets what alight, smoke and air, what could not be computed, which cautions stand with it. Returns its first sheet.
 */
export function writeTallyPages(
  flow: Flow,
  report: ReportBook,
  room: RoomReport,
  workings: () => Sheet | undefined,
): Sheet {
  const { figures } = report;
  const { tally, storey } = room;
  const sheet = flow.startSection(`Tally · ${room.room.name}`);
  const notes = new RoomNotes();
  const facts = [
    `Room ${room.number}`,
    storey.name,
    `${figures.estimate(tally.room.floorArea)}${notes.marks(tally.room.floorArea)}`,
    `${figures.quantity(room.room.height_m ?? storey.height_m, 'm')} high`,
    useText(room.room.use),
  ];
  writeTitle(flow, room.room.name, facts.join(' · '));
  writeHeadline(flow, report, room, notes);
  writeMadeOf(flow, report, room, notes);
  writeLedger(flow, report, room);
  writeSure(flow, report, room);
  writeCurve(flow, report, room, notes);
  writeResponse(flow, report, room, notes);
  writeRoomFigures(flow, report, room, notes);
  writeBurnout(flow, report, room, notes);
  writeSpread(flow, report, room, notes);
  writeAir(flow, report, room, notes);
  writeMissing(flow, room);
  writeNotes(flow, notes);
  writeCautionTitles(flow, room);
  flow.need(SIZE.table * 2);
  const [end, y, left] = [flow.sheet, flow.y, flow.left];
  flow.later(() => {
    const target = workings();
    if (target === undefined) return;
    const text = `Every number above is derived in the workings of this room, page ${flow.pageOf(target)}`;
    const wide = end.text(text, left, y + SIZE.table, { size: SIZE.table, colour: VERDIGRIS });
    end.link(left, y, wide, SIZE.table + 3, target);
  });
  flow.gap(SIZE.table + 4);
  return sheet;
}

function useText(use: string | null): string {
  if (use === null) return 'no use recorded';
  return `used as ${(useByKey(use)?.label ?? use).toLowerCase()}`;
}
