import { estimate, estimateOutputs, type Estimate, type EstimateWarning } from '../methods/estimate.ts';
import { figure } from '../methods/figure.ts';
import {
  fuelCorrection,
  NO_CORRECTION,
  parametricCurve,
  parametricFire,
  parametricPoints,
} from '../methods/burnout/parametric-curve.ts';
import { floorToEnclosure } from '../methods/load/floor-to-enclosure.ts';
import { rangeFaults } from '../methods/range-faults.ts';
import { standingOf } from '../limits/standing.ts';
import type { BurnoutGiven } from './burnout-given.ts';
import { cellulosicShare, LEAST_CELLULOSIC } from './cellulosic-share.ts';
import { equivalentTimeOf } from './equivalent-time-of.ts';
import type { BurnoutCase } from './room-tally.ts';
import { noteMissing, type TallyContext } from './tally-context.ts';
import { timeLimit } from './time-limit.ts';

const LARGEST_FLOOR_M2 = 500;
const HIGHEST_M = 4;

/** Burn-out with one load: as kept or as designed. */
export function burnoutCase(
  name: 'asKept' | 'design',
  load: Estimate,
  inertia: Estimate | undefined,
  given: BurnoutGiven,
  context: TallyContext,
): BurnoutCase {
  const q_fd = load.value ?? 0;
  const loadPerEnclosure = estimate(
    floorToEnclosure,
    { q_fd, A_f: given.areas.floor, A_t: given.areas.enclosing },
    { workings: context.workings, warnings: load.warnings },
  );
  const q_td = loadPerEnclosure.value ?? 0;
  const parametric = parametricOf(`burnout.${name}.parametric`, q_td, load.warnings, inertia, given, context);
  const path = `burnout.${name}.equivalentTime`;
  const equivalentTime = equivalentTimeOf(path, q_fd, load.warnings, inertia, given, context);
  if (!equivalentTime) noteMissing(context, `burnout.${name}.standing`, path, 'It needs the equivalent time.');
  return {
    loadPerEnclosure,
    ...(parametric && { parametric }),
    ...(equivalentTime && {
      equivalentTime,
      standing: standingOf(equivalentTime.value, given.input.room.rating_min),
    }),
  };
}

function parametricOf(
  path: string,
  q_td: number,
  loadWarnings: readonly EstimateWarning[],
  inertia: Estimate | undefined,
  given: BurnoutGiven,
  context: TallyContext,
): BurnoutCase['parametric'] {
  const { areas, openings, linings } = given;
  const reasons: { input: string; text: string }[] = [];
  const refuse = (input: string, text: string) => reasons.push({ input, text });
  if (areas.floor > LARGEST_FLOOR_M2)
    refuse('room.ring_m', `The floor of ${figure(areas.floor)} m2 is larger than 500 m2.`);
  if (areas.height > HIGHEST_M) refuse('room.height_m', `The room is ${figure(areas.height)} m high, more than 4 m.`);
  if (openings.roofVents > 0) refuse('room.roof_vents_state', 'A roof vent is not closed.');
  const share = cellulosicShare(given.heats);
  if (share < LEAST_CELLULOSIC) {
    refuse(
      'contents',
      `Only ${Math.round(share * 100)} % of the heat is cellulosic; the curve is made for 80 % and more.`,
    );
  }
  if (!inertia)
    refuse(`room.lining.${linings.unknown[0] ?? 'walls'}`, 'The thermal inertia of the linings is not known.');
  const inputs = {
    O: openings.afterGlass.openingFactor,
    b: inertia?.value ?? parametricCurve.inputs.b.valid[0],
    q_td,
    t_lim: timeLimit(given),
  };
  for (const fault of rangeFaults(parametricCurve, inputs)) refuse(FIELD[fault.input] ?? 'room', fault.text);
  const corrected = fuelCorrection(inputs.O, inputs.b, inputs.q_td) > 0;
  if ((0.2e-3 * inputs.q_td) / inputs.O <= inputs.t_lim && !corrected) refuse('room.openings', NO_CORRECTION);
  if (reasons.length > 0) {
    return noteMissing(context, path, reasons[0]!.input, reasons.map(({ text }) => text).join(' '));
  }
  const run = estimateOutputs(parametricCurve, inputs, {
    workings: context.workings,
    warnings: [...loadWarnings, ...(inertia?.warnings ?? []), ...jumpWarning(inputs)],
    origins: { t_lim: given.input.options?.time_limit_min == null ? 'default' : 'given' },
  });
  return {
    peak: run.of('peak'),
    timeOfPeak: run.of('timeOfPeak'),
    curve: parametricPoints(run.result),
    controlledBy: run.result.fuelControlled ? 'fuel' : 'ventilation',
  };
}

const FIELD: Readonly<Record<string, string>> = {
  O: 'room.openings',
  b: 'room.lining.walls',
  q_td: 'contents',
  t_lim: 'options.time_limit_min',
};

/** The curve jumps where 0.2e-3 q/O passes t_lim; within 10 % of it both sides are told. */
function jumpWarning({ O, b, q_td, t_lim }: { O: number; b: number; q_td: number; t_lim: number }): EstimateWarning[] {
  const nearness = (0.2e-3 * q_td) / O / t_lim;
  if (nearness < 0.9 || nearness > 1.1 || !(fuelCorrection(O, b, q_td) > 0)) return [];
  const fuel = parametricFire(O, b, q_td, t_lim, true).peak;
  const air = parametricFire(O, b, q_td, t_lim, false).peak;
  return [
    {
      code: 'NEAR_JUMP',
      text: `The curve jumps near this load: ${figure(Math.round(fuel))} °C while the fuel controls, ${figure(Math.round(air))} °C once the openings do.`,
    },
  ];
}
