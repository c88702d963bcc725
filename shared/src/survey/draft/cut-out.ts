import { ringEdges } from '../../geometry/ring-edges.ts';
import { wallKey } from '../derive/wall-key.ts';
import type { Room } from '../survey-document.ts';

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

/** The loop going round the other side of `inner` where the two share one unbroken stretch. */
function splice(loop: Loop, inner: Loop): string[] | null {
  const walls = new Set(ringEdges(loop).map(([a, b]) => wallKey(a, b)));
  const shared = ringEdges(inner).map(([a, b]) => walls.has(wallKey(a, b)));
  const starts = shared.flatMap((is, index) => (is && shared.at(index - 1) === false ? [index] : []));
  const [start] = starts;
  if (start === undefined || starts.length > 1) return null;
  const turned = [...inner.slice(start), ...inner.slice(0, start)];
  const length = [...shared.slice(start), ...shared.slice(0, start)].indexOf(false) + 1;
  const stretch = turned.slice(0, length);
  const detour = turned.slice(length);
  const visited = new Set(loop);
  if (detour.some((id) => visited.has(id))) return null;
  const dropped = new Set(stretch.slice(1, -1));
  const first = stretch[0] as string;
  const last = stretch.at(-1) as string;
  const kept = loop.filter((id) => !dropped.has(id));
  // After the drop the ends of the stretch are neighbours; the detour goes between them, the way the loop runs.
  const at = kept.indexOf(first);
  const lastFollows = kept[(at + 1) % kept.length] === last && (kept.length > 2 || at === 0);
  const firstFollows = kept[(kept.indexOf(last) + 1) % kept.length] === first;
  if (lastFollows === firstFollows && kept.length > 2) return null;
  if (lastFollows) return insertAfter(kept, at, [...detour].reverse());
  return insertAfter(kept, kept.indexOf(last), detour);
}

function insertAfter(loop: Loop, index: number, ids: readonly string[]): string[] {
  return [...loop.slice(0, index + 1), ...ids, ...loop.slice(index + 1)];
}
