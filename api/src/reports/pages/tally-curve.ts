import { drawChart, type ChartThreshold } from '../layout/draw-chart.ts';
import type { Flow } from '../layout/flow.ts';
import { INK, LOAD_COLOURS, MADDER, mixed, PAGE, SIZE, SOFT } from '../layout/theme.ts';
import { writeHeading } from '../layout/write-heading.ts';
import { writeText } from '../layout/write-text.ts';
import type { ReportBook, RoomReport } from '../report-book.ts';
import { lowestFlashover } from './lowest-flashover.ts';
import type { RoomNotes } from './room-notes.ts';
import { writeFigureList } from './write-figure-list.ts';

const HEIGHT = 175;
/** A fire that lasts longer is drawn in hours. */
const LONG_S = 6 * 3600;
const GOVERNED: Readonly<Record<string, string>> = {
  fuel: 'the fuel',
  openings: 'the openings',
  load: 'the load, which burns out while the fire still grows',
  closed: 'the fuel; the room has no opening',
};

/** The heat release curve against what the openings can feed and what would flash the room over, then its figures. */
export function writeCurve(flow: Flow, { figures }: ReportBook, { tally }: RoomReport, notes: RoomNotes): void {
  const { growth, room } = tally;
  writeHeading(flow, 'How fast it could come out', growth.curve === undefined ? 30 : HEIGHT);
  if (growth.curve === undefined || growth.curve.length < 2) {
    writeText(flow, 'No curve could be computed for this room; what is missing is named below.', { colour: SOFT });
  } else {
    const limit = room.ventilationLimitAfterGlass ?? room.ventilationLimit;
    const lowest = lowestFlashover(tally);
    const thresholds: ChartThreshold[] = [];
    if (limit?.value != null) {
      const label = `openings can feed ${figures.quantity(limit.value, 'kW')}`;
      thresholds.push({ label, value: figures.onAxis(limit.value, 'kW'), colour: INK, dash: [1, 2] });
    }
    if (lowest !== null) {
      const label = `flashover, ${lowest.name}, ${figures.quantity(lowest.value, 'kW')}`;
      thresholds.push({ label, value: figures.onAxis(lowest.value, 'kW'), colour: MADDER, dash: [5, 3] });
    }
    const hours = (growth.curve.at(-1)?.[0] ?? 0) > LONG_S;
    const points = growth.curve.map(([s, kW]) => [s / (hours ? 3600 : 60), figures.onAxis(kW, 'kW')] as const);
    const frame = {
      x: flow.left,
      y: flow.y,
      width: flow.width,
      height: HEIGHT,
      xTitle: `${hours ? 'hours' : 'minutes'} from the start of growth`,
      yTitle: `Heat release rate, ${figures.unit('kW')}`,
      figure: (value: number) => figures.asEntered(value, ''),
    };
    const fill = mixed(LOAD_COLOURS[2] ?? PAGE, PAGE, 0.28);
    drawChart(flow.sheet, flow.file.book, frame, [{ label: '', points, colour: INK, width: 1.3, fill }], thresholds);
    flow.y += HEIGHT + 8;
  }
  if (growth.governedBy !== undefined) {
    writeText(flow, `The plateau is governed by ${GOVERNED[growth.governedBy] ?? growth.governedBy}.`, { after: 4 });
  }
  const list = [
    ['Peak heat release', growth.peak],
    ['Growth coefficient', growth.alpha],
    ['Plateau the fuel allows', growth.fuelPlateau],
    ['Plateau the openings allow', growth.openingsPlateau],
    ['End of growth', growth.growthEnd],
    ['Start of decay', growth.decayStart],
    ['End of the fire', growth.end],
    ['Heat released', growth.heatReleased],
  ] as const;
  writeFigureList(flow, figures, notes, list);
  flow.gap(SIZE.heading);
}
