import type { RoomTally } from '@embertally/shared/tally/room-tally';
import type { Standing } from './room-plates.ts';

const ORDER: readonly Standing[] = ['no limit set', 'within', 'near', 'over'];

/** How a room stands against the limit it comes worst off with. */
export function worstStanding(tally: RoomTally): Standing {
  return tally.limits.reduce<Standing>(
    (worst, { standing }) => (ORDER.indexOf(standing) > ORDER.indexOf(worst) ? standing : worst),
    'no limit set',
  );
}
