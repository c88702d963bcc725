import { hydrocarbonCurve } from '../methods/burnout/nominal-curves.ts';
import { estimate, type Estimate, type EstimateWarning } from '../methods/estimate.ts';
import { burnoutCase } from './burnout-case.ts';
import type { BurnoutGiven } from './burnout-given.ts';
import { cellulosicShare, LEAST_CELLULOSIC } from './cellulosic-share.ts';
import { timeLimit } from './time-limit.ts';
import { roomThermalInertia } from './room-linings.ts';
import type { RoomTally } from './room-tally.ts';
import { noteMissing, type TallyContext } from './tally-context.ts';

/** A fire behind a keyhole would last longer; by then every layer has long heated through. */
const LONGEST_H = 1000;

type Burnout = RoomTally['burnout'];

/**
 * The section `burnout` of a tally: a fire that burns the room out, as kept first and then as designed, with every glass
 * broken that would break; and the same before any breaks, because less air is not always better.
 */
export function burnoutSection(given: BurnoutGiven, context: TallyContext): Burnout {
  const burnout = burnoutOf(given, context);
  const { openings } = given;
  const differs = openings.open.factor > 0 && openings.open.factor !== openings.afterGlass.factor;
  const before = { ...openings, afterGlass: openings.open, outsideArea: openings.outsideAreaOpen };
  const silent = { workings: context.workings, missing: [] };
  const hydrocarbon = hydrocarbonOf(given, context);
  return {
    ...burnout,
    ...(differs && burnout.asKept && { beforeGlass: burnoutOf({ ...given, openings: before }, silent) }),
    ...(hydrocarbon && { hydrocarbon }),
  };
}

function burnoutOf(given: BurnoutGiven, context: TallyContext): Omit<Burnout, 'beforeGlass' | 'hydrocarbon'> {
  const { areas, openings, linings, load } = given;
  const stage = openings.afterGlass;
  const why =
    load.asKept === undefined || load.design === undefined
      ? 'The room has no floor area.'
      : !(stage.factor > 0)
        ? 'No opening is open or would break.'
        : !(stage.liningArea > 0)
          ? 'The openings are as large as the walls.'
          : undefined;
  if (why !== undefined || !load.asKept || !load.design) {
    for (const path of ['thermalInertia', 'openingFactor', 'asKept', 'design']) {
      noteMissing(context, `burnout.${path}`, 'room.openings', why ?? 'The load is not known.');
    }
    return {};
  }
  const inertia = (q_f: number): Estimate | undefined => {
    if (linings.unknown.length > 0) return undefined;
    const heating = (0.2e-3 * q_f * areas.floor) / areas.enclosing / stage.openingFactor;
    const t_max = Math.min(LONGEST_H, Math.max(heating, timeLimit(given)));
    return roomThermalInertia(linings, areas, stage, openings.roofVents, t_max, context);
  };
  const thermalInertia = inertia(load.asKept.value ?? 0);
  if (!thermalInertia) {
    const side = linings.unknown[0] ?? 'walls';
    noteMissing(
      context,
      'burnout.thermalInertia',
      `room.lining.${side}`,
      `The lining of ${linings.unknown.join(', ')} is not known.`,
    );
  }
  return {
    ...(thermalInertia && { thermalInertia }),
    openingFactor: stage.estimates.openingFactor,
    asKept: burnoutCase('asKept', load.asKept, thermalInertia, given, context),
    design: burnoutCase('design', load.design, inertia(load.design.value ?? 0), given, context),
  };
}

const VARIANT: EstimateWarning = {
  code: 'VARIANT',
  text: 'A variant beside the burn-out: a nominal curve, which knows neither the load nor the room.',
};
const AN_HOUR_MIN = 60;
const DRAWN_PIECES = 60;

/** The nominal curve for liquids and plastics, where they hold more than a fifth of the heat. */
function hydrocarbonOf({ heats, input }: BurnoutGiven, { workings }: TallyContext): Burnout['hydrocarbon'] {
  if (cellulosicShare(heats) >= LEAST_CELLULOSIC) return undefined;
  const rating = input.room.rating_min ?? null;
  const after_min = rating !== null && rating > 0 ? rating : AN_HOUR_MIN;
  const temperature = estimate(
    hydrocarbonCurve,
    { t: after_min },
    {
      workings,
      warnings: [VARIANT],
      origins: { t: rating === after_min ? 'given' : { origin: 'default', note: 'the room has no rated time' } },
    },
  );
  // Close together at first, where the curve is steep.
  const curve = Array.from({ length: DRAWN_PIECES + 1 }, (_, k) => {
    const t = after_min * (k / DRAWN_PIECES) ** 2;
    return [t, hydrocarbonCurve.run({ t })] as const;
  });
  return { temperature, after_min, curve };
}
