import type { CurveAxis, CurveChart } from './curve-chart.ts';
import { curveRows } from './curve-rows.ts';

const columnName = (axis: CurveAxis, suffix: string): string =>
  [axis.column, suffix, axis.unit]
    .map((part) => part.normalize('NFKD').replace(/[^A-Za-z0-9]+/g, '_'))
    .map((part) => part.replace(/^_+|_+$/g, ''))
    .filter((part) => part !== '')
    .join('_');

const cell = (value: number | null): string => (value === null ? '' : String(Number(value.toPrecision(6))));

/**
 * The chart as a file: RFC 4180, CRLF, point decimals, a unit in every column name. Thresholds and moments are columns of their
 * own, the same in each row, so that the file alone can be drawn again.
 */
export function curveCsv(chart: CurveChart): string {
  const moments = chart.moments ?? [];
  const several = chart.series.length > 1;
  const header = [
    columnName(chart.x, ''),
    ...chart.series.map((series) => columnName(chart.y, several ? series.id : '')),
    ...chart.thresholds.map((threshold) => columnName(chart.y, threshold.id)),
    ...moments.map((moment) => columnName(chart.x, moment.id)),
  ];
  const rows = curveRows(chart).map((row) => [
    cell(row.x),
    ...row.values.map(cell),
    ...chart.thresholds.map((threshold) => cell(threshold.y)),
    ...moments.map((moment) => cell(moment.x)),
  ]);
  return [header, ...rows].map((fields) => fields.join(',') + '\r\n').join('');
}
