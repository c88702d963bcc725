import type { Standing } from '@embertally/shared/limits/standing';
import type { RoomTally } from '@embertally/shared/tally/room-tally';

const GRAVITY: Readonly<Record<Standing, number>> = { over: 3, near: 2, within: 1, 'no limit set': 0 };

/** How a room stands against the worst of its limits. */
export function roomStanding(tally: RoomTally | null): Standing {
  return (tally?.limits ?? []).reduce<Standing>(
    (worst, { standing }) => (GRAVITY[standing] > GRAVITY[worst] ? standing : worst),
    'no limit set',
  );
}
