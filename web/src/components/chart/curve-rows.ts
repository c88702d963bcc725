import type { CurveChart } from './curve-chart.ts';
import { readCurve } from './read-curve.ts';

export interface CurveRow {
  readonly x: number;
  /** One per series; null where that line does not reach. */
  readonly values: readonly (number | null)[];
}

/** The numbers behind a chart: one row per x at which any line has a point, in order. */
export function curveRows(chart: CurveChart): readonly CurveRow[] {
  const xs = [...new Set(chart.series.flatMap((series) => series.points.map(([x]) => x)))].sort((a, b) => a - b);
  return xs.map((x) => ({ x, values: chart.series.map((series) => readCurve(series.points, x)) }));
}
