import type { Standing } from '@embertally/shared/limits/standing';
import { useByKey } from '@embertally/shared/catalogue/uses';
import { STANDING_COLOURS } from '../layout/draw-standing.ts';
import type { Flow } from '../layout/flow.ts';
import { SOFT } from '../layout/theme.ts';
import { writeTitle } from '../layout/write-heading.ts';
import { writeTable, type Cell, type Column, type TableRow } from '../layout/write-table.ts';
import { writeText } from '../layout/write-text.ts';
import type { Sheet } from '../pdf/sheet.ts';
import { countText } from '../count-text.ts';
import type { ReportBook, RoomReport } from '../report-book.ts';

/** Every room in one table with its figures, its standing and the page of its tally. */
export function writeRoomsPage(
  flow: Flow,
  { storeys, rooms, figures }: ReportBook,
  tallyOf: (roomId: string) => Sheet | undefined,
): Sheet {
  const sheet = flow.startSection('Rooms', 'landscape');
  writeTitle(flow, 'Rooms', countText(rooms.length, 'room'));
  if (rooms.length === 0) {
    writeText(flow, 'No room has been drawn yet.', { colour: SOFT });
    return sheet;
  }
  const density = figures.unit('MJ/m2');
  const columns: Column[] = [
    { title: '', width: 18, align: 'right' },
    { title: 'Room', width: { share: 1 } },
    { title: 'Use', width: { share: 0.8 } },
    { title: `Area, ${figures.unit('m2')}`, width: 42, align: 'right' },
    { title: `Heat kept, ${figures.unit('MJ')}`, width: 58, align: 'right' },
    { title: `Density, ${density}`, width: 66, align: 'right' },
    { title: '5–95 % band', width: 66, align: 'right' },
    { title: `Peak, ${figures.unit('kW')}`, width: 46, align: 'right' },
    { title: 'Flashover after', width: 62, align: 'right' },
    { title: 'Equivalent time, as kept', width: 58, align: 'right' },
    { title: 'Standing', width: 58 },
    { title: 'Page', width: 24, align: 'right' },
  ];
  writeTable(flow, columns, tableRows(), { gutter: 12 });
  flow.gap(8);
  const note =
    '– could not be computed; the tally of the room names what is missing. never: the design fire does not reach it.';
  writeText(flow, note, { size: 7.5, colour: SOFT });
  return sheet;

  function* tableRows(): Generator<TableRow> {
    for (const storey of storeys) {
      if (storey.rooms.length > 0) yield { kind: 'group', cells: [storey.storey.name] };
      for (const room of storey.rooms) yield { cells: roomCells(room) };
    }
  }

  function roomCells({ number, room, tally, standing }: RoomReport): (string | Cell)[] {
    const { load, growth, burnout } = tally;
    const { band } = load;
    const range =
      band?.p5.value == null || !band.p95.value
        ? '–'
        : `${figures.bare(band.p5.value, 'MJ/m2')}–${figures.bare(band.p95.value, 'MJ/m2')}`;
    return [
      String(number),
      room.name,
      room.use === null ? '–' : (useByKey(room.use)?.label ?? room.use),
      figures.bareEstimate(tally.room.floorArea),
      figures.bareEstimate(load.total),
      figures.bareEstimate(load.perFloor),
      range,
      figures.bareEstimate(growth.peak),
      figures.estimate(tally.room.flashover.time),
      figures.estimate(burnout.asKept?.equivalentTime),
      standingCell(standing),
      { text: '', page: () => tallyOf(room.id) },
    ];
  }
}

function standingCell(standing: Standing): Cell {
  const marked = standing === 'near' || standing === 'over';
  return {
    text: standing === 'no limit set' ? 'no limit' : standing,
    colour: STANDING_COLOURS[standing],
    weight: marked ? 'bold' : 'regular',
    ...(marked ? { edge: standing } : {}),
  };
}
