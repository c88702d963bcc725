import type { RoomTally, SpreadTally } from '@embertally/shared/tally/room-tally';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import type { UnitSystem } from '@embertally/shared/units/unit-system';
import type { CurveChart, CurveThreshold } from '../../../components/chart/curve-chart.ts';
import { readCurve } from '../../../components/chart/read-curve.ts';
import { lowestFlashover } from '../lowest-flashover.ts';
import { powerUnit } from '../power-unit.ts';

/**
 * The heat release of the room, built up from its entries as they light, with a mark where each does.
 *
 * @param until_s the curve is drawn so far, s
 * @returns null without a curve
 */
export function orderChart(
  { room }: RoomTally,
  { curve, events = [], flashover, peak }: SpreadTally,
  system: UnitSystem,
  fileName: string,
  until_s = Infinity,
): CurveChart | null {
  if (curve === undefined || curve.length < 2) return null;
  const peak_kW = peak?.value ?? Math.max(...curve.map(([, kW]) => kW));
  const { symbol, of, text } = powerUnit(peak_kW, system);
  const lowest_kW = lowestFlashover(room.flashover)?.value_kW ?? null;
  const feed_kW = room.ventilationLimitAfterGlass?.value ?? room.ventilationLimit?.value ?? null;
  // A level far above the fire would press the curve flat against the axis.
  const isNear = (kW: number | null): kW is number => kW !== null && kW <= peak_kW * 2.5;
  const thresholds: CurveThreshold[] = [];
  if (isNear(feed_kW)) {
    const label = `openings can feed ${text(feed_kW)}, by oxygen`;
    thresholds.push({ id: 'openings', label, y: of(feed_kW), tone: 'ink', dash: [2, 3] });
  }
  if (isNear(lowest_kW)) {
    const label = `flashover ${text(lowest_kW)}`;
    thresholds.push({ id: 'flashover', label, y: of(lowest_kW), tone: 'madder', dash: [7, 4] });
  }
  const lit = events.filter((event) => event.id !== null);
  const spoken = (s: number): string => {
    const shown = formatQuantity(s, 's', system);
    return `${shown.text} ${shown.unit}`;
  };
  const many = lit.length === 1 ? 'Nothing else lights' : `${lit.length} entries burn in turn`;
  const over = flashover?.value == null ? 'the room does not flash over' : `flashover after ${spoken(flashover.value)}`;
  return {
    title: `${many}; together they reach ${text(peak_kW)}; ${over}.`,
    summary: `Heat release of the room over time, built up from ${lit.length} entries as they light.`,
    x: { label: 'Time since the first entry burns', unit: 'min', column: 'time' },
    y: { label: 'Heat release', unit: symbol, column: 'heat_release' },
    series: [
      {
        id: 'entries',
        label: 'entry by entry',
        points: cutAt(curve, until_s).map(([s, kW]) => [s / 60, of(kW)] as const),
        tone: 'ink',
        dash: [],
        filled: true,
      },
    ],
    thresholds,
    marks: lit.flatMap(({ t, cause }) => {
      const kW = t.value === null ? null : readCurve(curve, t.value);
      return kW === null || t.value === null || cause === 'flashover'
        ? []
        : [{ x: t.value / 60, y: of(kW), tone: 'ink' as const }];
    }),
    fileName,
  };
}

function cutAt(curve: NonNullable<SpreadTally['curve']>, until_s: number): NonNullable<SpreadTally['curve']> {
  const end = readCurve(curve, until_s);
  return end === null ? curve : [...curve.filter(([s]) => s < until_s), [until_s, end]];
}
