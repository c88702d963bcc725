import type { Room } from '../survey-document.ts';
import { splice } from './splice.ts';

type Loop = readonly string[];

/**
 * A room's outline with another room's ring taken out of it: a hole where the ring touches nothing, a bay where it lies
 * along one stretch of the outline (or of a hole already there).
 *
 *      ┌────────┐        ┌────────┐            ┌────────┐        ┌───┐
 *      │  ┌──┐  │   →    │  ┌──┐  │            │   ┌────┤   →    │   └────┐
 *      │  └──┘  │        │  └──┘  │            │   │    │        │        …
 *      └────────┘        └────────┘            └───┴────┘        └───┘
 *
 * Corners are shared already and `inner` lies inside the room.
 *
 * @returns null where the room would fall into several parts or touch itself in one corner
 */
export function cutOut(room: Pick<Room, 'ring' | 'holes'>, inner: Loop): Pick<Room, 'ring' | 'holes'> | null {
  const corners = new Set(inner);
  const loops = [room.ring, ...room.holes];
  const touched = loops.filter((loop) => loop.some((id) => corners.has(id)));
  if (touched.length === 0) return { ring: room.ring, holes: [...room.holes, [...inner]] };
  const [only] = touched;
  if (only === undefined || touched.length > 1) return null;
  const spliced = splice(only, inner);
  if (spliced === null) return null;
  if (only === room.ring) return { ring: spliced, holes: room.holes };
  return { ring: room.ring, holes: room.holes.map((hole) => (hole === only ? spliced : hole)) };
}
