import type { Estimate } from '../methods/estimate.ts';
import { burnoutCase } from './burnout-case.ts';
import type { BurnoutGiven } from './burnout-given.ts';
import { timeLimit } from './time-limit.ts';
import { roomThermalInertia } from './room-linings.ts';
import type { RoomTally } from './room-tally.ts';
import { noteMissing, type TallyContext } from './tally-context.ts';

/** A fire behind a keyhole would last longer; by then every layer has long heated through. */
const LONGEST_H = 1000;

/** The section `burnout` of a tally: a fire that burns the room out, as kept first and then as designed. */
export function burnoutSection(given: BurnoutGiven, context: TallyContext): RoomTally['burnout'] {
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
