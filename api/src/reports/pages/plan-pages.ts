import { roomRegion } from '@embertally/shared/survey/derive/room-region';
import type { Point as PlanPoint } from '@embertally/shared/geometry/point';
import { LOAD_BAND_EDGES } from '@embertally/shared/tally/density-band';
import { countText } from '../count-text.ts';
import type { Flow } from '../layout/flow.ts';
import { INK, MARGIN, PAPER_LONG, PAPER_SHORT, SIZE, SOFT } from '../layout/theme.ts';
import { writeTitle } from '../layout/write-heading.ts';
import { writeText } from '../layout/write-text.ts';
import type { Sheet } from '../pdf/sheet.ts';
import { drawOpening } from '../plan/draw-openings.ts';
import { drawStorey } from '../plan/draw-storey.ts';
import { fillBand } from '../plan/fill-band.ts';
import { planFrame, type PlanFrame } from '../plan/plan-frame.ts';
import { drawScaleBar } from '../plan/draw-scale-bar.ts';
import { drawNorth } from '../plan/draw-north.ts';
import type { ReportBook, StoreyReport } from '../report-book.ts';

const TITLE_HEIGHT = 62;
const LEGEND_HEIGHT = 58;
/** Room around the plan for the numbers of rooms whose floor is full. */
const EDGE = 26;

/** One page per storey: the plan to a true scale with its legend. Returns the sheet. */
export function writePlanPage(flow: Flow, report: ReportBook, storeyReport: StoreyReport): Sheet {
  const { storey, rooms } = storeyReport;
  const { figures, document } = report;
  const points = rooms.flatMap(({ room }): readonly PlanPoint[] => roomRegion(document.corners, room)?.ring ?? []);
  const orientation = betterOrientation(points);
  const sheet = flow.startSection(`Plan · ${storey.name}`, orientation);
  const frame = planFrame(points, boxFor(orientation), EDGE);
  const facts = [
    countText(rooms.length, 'room'),
    `level ${figures.quantity(storey.level_m, 'm')}`,
    `height ${figures.quantity(storey.height_m, 'm')}`,
  ];
  writeTitle(flow, storey.name, facts.join(' · '));
  if (points.length === 0) {
    writeText(flow, 'No room has been drawn on this storey.', { colour: SOFT });
    return sheet;
  }
  drawStorey(sheet, flow.file.book, figures, document, storeyReport, frame);
  if (storey.north_deg !== null) drawNorth(sheet, flow.right - 12, MARGIN.top + 16, storey.north_deg);
  drawLegend(flow, report, frame);
  return sheet;
}

function boxFor(orientation: 'portrait' | 'landscape') {
  const [width, height] = orientation === 'portrait' ? [PAPER_SHORT, PAPER_LONG] : [PAPER_LONG, PAPER_SHORT];
  return {
    x: MARGIN.left,
    y: MARGIN.top + TITLE_HEIGHT,
    width: width - MARGIN.left - MARGIN.right,
    height: height - MARGIN.top - MARGIN.bottom - TITLE_HEIGHT - LEGEND_HEIGHT,
  };
}

/** The way of turning the paper that lets the plan be larger. */
function betterOrientation(points: readonly PlanPoint[]): 'portrait' | 'landscape' {
  const ratio = (orientation: 'portrait' | 'landscape') => planFrame(points, boxFor(orientation), EDGE).scale.ratio;
  return ratio('landscape') < ratio('portrait') ? 'landscape' : 'portrait';
}

function drawLegend(flow: Flow, { figures }: ReportBook, frame: PlanFrame): void {
  const { sheet, left, right } = flow;
  const top = flow.bottom - LEGEND_HEIGHT + 14;
  const label = { size: SIZE.note, colour: SOFT };
  sheet.text(`Fire load density, ${figures.unit('MJ/m2')} of floor`, left, top, label);
  const [swatch, gap] = [34, 40];
  for (const [band, from] of LOAD_BAND_EDGES.entries()) {
    const x = left + band * gap;
    const box = [
      [x, top + 5],
      [x + swatch, top + 5],
      [x + swatch, top + 18],
      [x, top + 18],
    ] as const;
    fillBand(sheet, [box], band);
    sheet.rect(x, top + 5, swatch, 13, { stroke: { colour: INK, width: 0.5 } });
    sheet.text(`${figures.bare(from, 'MJ/m2')}${band === LOAD_BAND_EDGES.length - 1 ? ' +' : ''}`, x, top + 27, label);
  }
  let x = left;
  for (const kind of ['door', 'window', 'shutter', 'vent', 'gap'] as const) {
    sheet.line(
      [
        [x, top + 39],
        [x + 26, top + 39],
      ],
      { colour: INK, width: 2.4 },
    );
    drawOpening(sheet, [x + 5, top + 39], [x + 21, top + 39], { kind, state: 'closed' }, 2.2);
    x += 30 + sheet.text(kind, x + 30, top + 41.5, label) + 12;
  }
  sheet.text('number in a box: line of the room’s ledger', x, top + 41.5, label);
  drawScaleBar(sheet, figures, frame.scale, right, top + 8);
  sheet.text(`Scale 1:${frame.scale.ratio}, on A4 printed at 100 %`, right, top, { ...label, align: 'right' });
}
