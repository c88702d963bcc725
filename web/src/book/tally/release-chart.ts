import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import type { UnitSystem } from '@embertally/shared/units/unit-system';
import type { CurveChart, CurveMark, CurveMoment, CurveThreshold } from '../../components/chart/curve-chart.ts';
import { lowestFlashover } from './lowest-flashover.ts';
import { powerUnit } from './power-unit.ts';

/**
 * The heat release curve of the design fire with the levels it is read against.
 *
 * @returns null when the tally has no curve
 */
export function releaseChart(tally: RoomTally, system: UnitSystem, fileName: string): CurveChart | null {
  const { growth, room } = tally;
  if (growth.curve === undefined || growth.curve.length < 2) return null;
  const peak_kW = growth.peak?.value ?? Math.max(...growth.curve.map(([, kW]) => kW));
  const { symbol, of: inUnit, text } = powerUnit(peak_kW, system);
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

  const moments = answersOf(tally.response, (s) => spoken(formatQuantity(s, 's', system)));

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
    y: { label: 'Heat release', unit: symbol, column: 'heat_release' },
    series: [{ id: 'release', label: 'Heat release', points, tone: 'ink', dash: [], filled: true }],
    thresholds,
    moments,
    marks,
    fileName,
  };
}

/** When sprinkler and detectors answer to this fire, where they do. */
function answersOf(response: RoomTally['response'], spokenTime: (s: number) => string): readonly CurveMoment[] {
  const { sprinkler, detector, heatDetector, smokeDetector } = response;
  const both = heatDetector !== undefined && smokeDetector !== undefined;
  const answers = [
    ['sprinkler', 'sprinkler', sprinkler],
    ...(both
      ? ([
          ['smoke_detector', 'smoke detector', smokeDetector],
          ['heat_detector', 'heat detector', heatDetector],
        ] as const)
      : ([['detector', 'detector', detector]] as const)),
  ] as const;
  return answers.flatMap(([id, name, answer]) =>
    answer?.value == null
      ? []
      : [{ id, label: `${name} ${spokenTime(answer.value)}`, x: answer.value / 60, tone: 'verdigris', dash: [1, 3] }],
  );
}

const spoken = (shown: { readonly text: string; readonly unit: string }): string => `${shown.text} ${shown.unit}`;
