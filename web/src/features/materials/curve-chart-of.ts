import type { DerivedCurve } from '@embertally/shared/materials/derived-material';
import { convert } from '@embertally/shared/units/convert';
import { displayUnit } from '@embertally/shared/units/display-unit';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import type { UnitSystem } from '@embertally/shared/units/unit-system';
import type { CurveChart } from '../../components/chart/curve-chart.ts';

/** A measured curve as a chart, with its peak and what it released in words. */
export function curveChartOf(
  curve: Pick<DerivedCurve, 'per' | 'points' | 'heat_MJ' | 'peak' | 'peak_s'>,
  name: string,
  units: UnitSystem,
): CurveChart {
  const rate = curve.per === 'piece' ? 'kW' : 'kW/m2';
  const shown = displayUnit(rate, units);
  const say = (value: number, unit: string): string => {
    const { text, unit: symbol } = formatQuantity(value, unit, units);
    return `${text} ${symbol}`;
  };
  const heat = say(curve.heat_MJ, curve.per === 'piece' ? 'MJ' : 'MJ/m2');
  const peak = say(curve.peak, rate);
  return {
    title: `It reaches ${peak} after ${say(curve.peak_s, 's')} and gives off ${heat} ${curve.per === 'piece' ? 'in all' : 'of surface'}.`,
    summary: `Measured heat release of ${name} over time.`,
    x: { label: 'Time', unit: 'min', column: 'time' },
    y: { label: 'Heat release', unit: shown?.symbol ?? rate, column: 'heat_release' },
    series: [
      {
        id: 'measured',
        label: 'measured',
        points: curve.points.map(([t, q]) => [t / 60, convert(q, rate, shown?.key ?? rate)] as const),
        tone: 'ink',
        dash: [],
        filled: true,
      },
    ],
    thresholds: [],
    marks: [{ x: curve.peak_s / 60, y: convert(curve.peak, rate, shown?.key ?? rate), tone: 'madder' }],
    fileName: `${
      name
        .toLowerCase()
        .replaceAll(/[^a-z0-9]+/g, '-')
        .replaceAll(/^-|-$/g, '') || 'material'
    }-heat-release`,
  };
}
