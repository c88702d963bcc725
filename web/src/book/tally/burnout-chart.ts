import { standardCurve } from '@embertally/shared/methods/burnout/nominal-curves';
import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { convert } from '@embertally/shared/units/convert';
import { displayUnit } from '@embertally/shared/units/display-unit';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import type { UnitSystem } from '@embertally/shared/units/unit-system';
import type { CurveChart, CurveSeries } from '../../components/chart/curve-chart.ts';

const STEPS = 60;

/**
 * The burn-out curves of the room, as kept and for the design load, against the standard curve of furnace tests.
 *
 * @returns null when neither curve could be computed
 */
export function burnoutChart(tally: RoomTally, system: UnitSystem, fileName: string): CurveChart | null {
  const { asKept, design } = tally.burnout;
  const curves = [asKept?.parametric?.curve, design?.parametric?.curve].filter((curve) => curve !== undefined);
  if (curves.length === 0) return null;
  const unit = displayUnit('°C', system) ?? { key: '°C', symbol: '°C' };
  const inUnit = (celsius: number): number => convert(celsius, '°C', unit.key);
  const end_min = Math.max(...curves.map((curve) => curve.at(-1)?.[0] ?? 0));
  const drawn = (curve: readonly (readonly [number, number])[]) => curve.map(([t, C]) => [t, inUnit(C)] as const);

  const series: CurveSeries[] = [];
  if (asKept?.parametric !== undefined)
    series.push({ id: 'as_kept', label: 'as kept', points: drawn(asKept.parametric.curve), tone: 'ink', dash: [] });
  if (design?.parametric !== undefined)
    series.push({
      id: 'design',
      label: 'design load',
      points: drawn(design.parametric.curve),
      tone: 'verdigris',
      dash: [8, 4],
    });
  series.push({
    id: 'standard',
    label: 'standard curve',
    points: Array.from({ length: STEPS + 1 }, (_, step) => {
      const t = (end_min * step) / STEPS;
      return [t, inUnit(standardCurve.run({ t }))] as const;
    }),
    tone: 'soft',
    dash: [2, 3],
  });

  const peak = asKept?.parametric?.peak.value ?? design?.parametric?.peak.value ?? null;
  const shown = peak === null ? null : formatQuantity(peak, '°C', system);
  const whose = asKept?.parametric === undefined ? 'With the design load' : 'As kept';
  const title =
    shown === null ? 'Burn-out of the room.' : `${whose}, the room burns out at up to ${shown.text} ${shown.unit}.`;
  return {
    title,
    summary: 'Gas temperature over time for the burn-out of the room, beside the standard curve of furnace tests.',
    x: { label: 'Time', unit: 'min', column: 'time' },
    y: { label: 'Gas temperature', unit: unit.symbol, column: 'gas_temperature' },
    series,
    thresholds: [],
    marks: [],
    fileName,
  };
}
