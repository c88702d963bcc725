import type { Estimate } from '@embertally/shared/methods/estimate';
import type { BurnoutCase } from '@embertally/shared/tally/room-tally';
import { drawChart, type ChartSeries } from '../layout/draw-chart.ts';
import type { Flow } from '../layout/flow.ts';
import { INK, LOAD_COLOURS, MADDER, SIZE, SOFT, VERDIGRIS } from '../layout/theme.ts';
import { writeHeading } from '../layout/write-heading.ts';
import { writeTable, type TableRow } from '../layout/write-table.ts';
import { writeText } from '../layout/write-text.ts';
import type { ReportBook, RoomReport } from '../report-book.ts';
import type { RoomNotes } from './room-notes.ts';
import { standardCurve } from './standard-curve.ts';

const HEIGHT = 160;

/** The burn-out as kept and with the design load: temperatures against the standard curve, equivalent time, rating. */
export function writeBurnout(flow: Flow, report: ReportBook, { room, tally }: RoomReport, notes: RoomNotes): void {
  const { figures } = report;
  const { asKept, design, beforeGlass } = tally.burnout;
  if (asKept === undefined && design === undefined) return;
  writeHeading(flow, 'If it burns out', 80);
  const row = (
    name: string,
    of: (one: BurnoutCase) => Estimate | undefined,
    cases: Pick<typeof tally.burnout, 'asKept' | 'design'> = tally.burnout,
  ): TableRow[] => {
    const [kept, designed] = [cases.asKept && of(cases.asKept), cases.design && of(cases.design)];
    if (kept === undefined && designed === undefined) return [];
    const cell = (estimate: Estimate | undefined) => `${figures.estimate(estimate)}${notes.marks(estimate)}`;
    return [{ cells: [name, cell(kept), cell(designed)] }];
  };
  const { load } = tally;
  const density = (estimate: Estimate | undefined) => `${figures.estimate(estimate)}${notes.marks(estimate)}`;
  const rows: TableRow[] = [
    { cells: ['Load per unit of floor', density(load.asKept), density(load.design)] },
    ...row('Load per unit of enclosing surface', (one) => one.loadPerEnclosure),
    ...row('Highest gas temperature', (one) => one.parametric?.peak),
    ...row('Time of the highest temperature', (one) => one.parametric?.timeOfPeak),
    ...row('Equivalent time of exposure', (one) => one.equivalentTime),
    ...row('Highest gas temperature, before any glass breaks', (one) => one.parametric?.peak, beforeGlass ?? {}),
    ...row('Equivalent time, before any glass breaks', (one) => one.equivalentTime, beforeGlass ?? {}),
  ];
  if (room.rating_min !== null) {
    const against = `Against the rated ${figures.quantity(room.rating_min, 'min')}`;
    rows.push({ cells: [against, asKept?.standing ?? '–', design?.standing ?? '–'] });
  }
  const columns = [
    { title: '', width: { share: 1 } },
    { title: 'As kept', width: 120, align: 'right' as const },
    { title: 'Design load', width: 120, align: 'right' as const },
  ];
  writeTable(flow, columns, rows);
  flow.gap(10);
  const { hydrocarbon } = tally.burnout;
  if (hydrocarbon !== undefined) {
    const { temperature, after_min } = hydrocarbon;
    const text = `Liquids and plastics hold more than a fifth of the heat. By the hydrocarbon curve: ${figures.estimate(temperature)}${notes.marks(temperature)} after ${figures.quantity(after_min, 'min')}.`;
    writeText(flow, text, { after: 6 });
  }
  const series = curves(report, asKept, design);
  if (series.length > 0) {
    flow.need(HEIGHT + 8);
    const frame = {
      x: flow.left,
      y: flow.y,
      width: flow.width,
      height: HEIGHT,
      xTitle: 'minutes from flashover',
      yTitle: `Gas temperature, ${figures.unit('°C')}`,
      figure: (value: number) => figures.asEntered(value, ''),
    };
    drawChart(flow.sheet, flow.file.book, frame, series);
    flow.y += HEIGHT + 8;
  } else {
    writeText(flow, 'No burn-out curve applies to this room; the reasons are named below.', {
      size: SIZE.table,
      colour: SOFT,
      after: 6,
    });
  }
}

function curves({ figures }: ReportBook, asKept?: BurnoutCase, design?: BurnoutCase): ChartSeries[] {
  const drawn = (points: readonly (readonly [number, number])[]) =>
    points.map(([minute, celsius]) => [minute, figures.onAxis(celsius, '°C')] as const);
  const series: ChartSeries[] = [];
  if (asKept?.parametric !== undefined) {
    series.push({ label: 'as kept', side: 'left', points: drawn(asKept.parametric.curve), colour: INK, width: 1.3 });
  }
  if (design?.parametric !== undefined) {
    const colour = LOAD_COLOURS[3] ?? MADDER;
    series.push({
      label: 'design load',
      side: 'right',
      points: drawn(design.parametric.curve),
      colour,
      width: 1.2,
      dash: [6, 2.5],
    });
  }
  if (series.length === 0) return series;
  const end = Math.max(...series.flatMap(({ points }) => points.map(([minute]) => minute)));
  const standard = drawn(standardCurve(end));
  series.push({
    label: 'standard curve',
    side: 'end',
    points: standard,
    colour: VERDIGRIS,
    width: 0.9,
    dash: [1.5, 2.5],
  });
  return series;
}
