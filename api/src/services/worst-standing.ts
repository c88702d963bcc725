import type { LimitStanding } from '@embertally/shared/tally/room-tally';

/** The limit that is nearest or most exceeded decides how a room stands. */
export function worstStanding(limits: readonly LimitStanding[]): Pick<LimitStanding, 'standing' | 'ratio'> {
  let worst: Pick<LimitStanding, 'standing' | 'ratio'> = { standing: 'no limit set', ratio: null };
  for (const { standing, ratio } of limits) {
    if (ratio !== null && ratio > (worst.ratio ?? -Infinity)) worst = { standing, ratio };
  }
  return worst;
}
