import type { SpreadTally } from '@embertally/shared/tally/room-tally';
import type { PlayedFire } from '../../spread/spread-play.ts';

/** After the last event so much of the time before it is still shown, and so long at least. */
const AFTER = 0.15;
const LEAST_AFTER_S = 30;

/** The fire of a tally as the plan plays it: until shortly after the last event, or to its end when nothing else lights. */
export function firePlayed(roomId: string, of: unknown, { events = [], flashover, curve }: SpreadTally): PlayedFire {
  const last_s = events.at(-1)?.t.value ?? 0;
  const out_s = curve?.at(-1)?.[0] ?? last_s;
  const after_s = last_s + Math.max(LEAST_AFTER_S, last_s * AFTER);
  return {
    roomId,
    of,
    events: events.map(({ id, t, cause, from }) => ({ id, t_s: t.value ?? 0, cause, from: from ?? null })),
    flashover_s: flashover?.value ?? null,
    end_s: last_s === 0 ? out_s : Math.min(out_s, after_s),
  };
}
