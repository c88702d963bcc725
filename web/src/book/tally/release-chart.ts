import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { convert } from '@embertally/shared/units/convert';
import { displayUnit } from '@embertally/shared/units/display-unit';
import { formatNumber } from '@embertally/shared/units/format-number';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import type { UnitSystem } from '@embertally/shared/units/unit-system';
import type { CurveChart, CurveMark, CurveThreshold } from '../../components/chart/curve-chart.ts';
import { lowestFlashover } from './lowest-flashover.ts';

/** Large fires are read in MW, small ones in kW; in US customary units in Btu/s. */
function powerUnit(peak_kW: number, system: UnitSystem): { readonly key: string; readonly symbol: string } {
  if (system === 'SI' && peak_kW >= 1000) return { key: 'MW', symbol: 'MW' };
  return displayUnit('kW', system) ?? { key: 'kW', symbol: 'kW' };
}

/**
 * The heat release curve of the design fire with the levels it is read against.
 *
 * @returns null when the tally has no curve
 */
export function releaseChart(tally: RoomTally, system: UnitSystem, fileName: string): CurveChart | null {
  const { growth, room } = tally;
  if (growth.curve === undefined || growth.curve.length < 2) return null;
  const peak_kW = growth.peak?.value ?? Math.max(...growth.curve.map(([, kW]) => kW));
  const unit = powerUnit(peak_kW, system);
  const inUnit = (kW: number): number => convert(kW, 'kW', unit.key);
  const text = (kW: number): string => `${formatNumber(inUnit(kW), 3)} ${unit.symbol}`;
  const points = growth.curve.map(([s, kW]) => [s / 60, inUnit(kW)] as const);

  const thresholds: CurveThreshold[] = [];
  const marks: CurveMark[] = [];
  const feed_kW = growth.openingsPlateau?.value ?? null;
  // A level far above the fire would press the curve flat against the axis; it is said in words instead.
  const isNear = (kW: number): boolean => kW <= peak_kW * 2.5;
  if (feed_kW !== null && isNear(feed_kW)) {
    thresholds.push({
      id: 'openings',
      label: `openings can feed ${text(feed_kW)}`,
      y: inUnit(feed_kW),
      tone: 'ink',
      dash: [2, 3],
    });
  }
  const flashover = lowestFlashover(room.flashover);
  if (flashover !== null && isNear(flashover.value_kW)) {
    thresholds.push({
      id: 'flashover',
      label: `flashover (lowest that applies) ${text(flashover.value_kW)}`,
      y: inUnit(flashover.value_kW),
      tone: 'madder',
      dash: [7, 4],
    });
    const at = room.flashover.time?.value ?? null;
    if (at !== null) marks.push({ x: at / 60, y: inUnit(flashover.value_kW), tone: 'madder' });
  }

  const end_s = growth.end?.value ?? growth.curve.at(-1)?.[0] ?? 0;
  const end = formatQuantity(end_s, 's', system);
  const peak = `It could reach ${text(peak_kW)}`;
  const time = room.flashover.time;
  const reaches =
    time?.value != null
      ? ` and flash the room over after ${spoken(formatQuantity(time.value, 's', system))}`
      : time?.never !== undefined
        ? ' and would not reach flashover'
        : '';
  const far = [
    feed_kW !== null && !isNear(feed_kW) ? `The openings could feed ${text(feed_kW)}, off the top of this chart.` : '',
    flashover !== null && !isNear(flashover.value_kW)
      ? `Flashover would need ${text(flashover.value_kW)}, off the top of this chart.`
      : '',
  ].filter((sentence) => sentence !== '');
  return {
    title: [`${peak}${reaches}.`, ...far].join(' '),
    summary: `Heat release over time: it grows to ${text(peak_kW)} and is out after ${spoken(end)}.`,
    x: { label: 'Time', unit: 'min', column: 'time' },
    y: { label: 'Heat release', unit: unit.symbol, column: 'heat_release' },
    series: [{ id: 'release', label: 'Heat release', points, tone: 'ink', dash: [], filled: true }],
    thresholds,
    marks,
    fileName,
  };
}

const spoken = (shown: { readonly text: string; readonly unit: string }): string => `${shown.text} ${shown.unit}`;
