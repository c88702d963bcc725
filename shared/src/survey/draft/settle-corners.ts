import { distance } from '../../geometry/distance.ts';
import { nearestOnSegment } from '../../geometry/nearest-on-segment.ts';
import { onSegment } from '../../geometry/on-segment.ts';
import { ringEdges } from '../../geometry/ring-edges.ts';
import { ROUNDING_M, TOLERANCE_M } from '../../geometry/tolerance.ts';
import { loopsOfRoom } from '../derive/loops-of-room.ts';
import type { Corner, Room } from '../survey-document.ts';
import type { SurveyDraft } from './survey-draft.ts';

type Loop = readonly string[];

/** Joining a corner to a wall bends the wall by less than the tolerance, so it comes to rest at once; this is a stop. */
const MOST_PASSES = 8;

/**
 * Makes rooms share what lies in the same place, after corners were put or moved: a corner within tolerance of another
 * becomes that other one, and a corner within tolerance of a wall is inserted into every ring along that wall.
 */
export function settleCorners(draft: SurveyDraft, storeyId: string): void {
  joinCoincident(draft, storeyId);
  for (let pass = 0; pass < MOST_PASSES && insertTouching(draft, storeyId); pass += 1);
}

function joinCoincident(draft: SurveyDraft, storeyId: string): void {
  const moved = draft.movedCorners();
  for (const id of moved) {
    const corner = draft.get('corner', id);
    if (corner?.storey_id !== storeyId) continue;
    // The corner that was there keeps its id; of two new ones the first.
    const near = draft
      .cornersOf(storeyId)
      .filter((other) => other.id !== id && distance(other, corner) <= TOLERANCE_M + ROUNDING_M);
    const target = near.find((other) => !moved.has(other.id)) ?? near[0];
    if (target !== undefined) replaceCorner(draft, storeyId, id, target.id);
  }
}

function replaceCorner(draft: SurveyDraft, storeyId: string, from: string, to: string): void {
  const swap = (id: string): string => (id === from ? to : id);
  for (const room of draft.roomsOf(storeyId)) {
    if (!loopsOfRoom(room).some((loop) => loop.includes(from))) continue;
    draft.put('room', { ...room, ring: room.ring.map(swap), holes: room.holes.map((hole) => hole.map(swap)) });
  }
  for (const opening of draft.openingsOf(storeyId)) {
    const [a, b] = opening.wall;
    if (a === from || b === from) draft.put('opening', { ...opening, wall: [swap(a), swap(b)] });
  }
  draft.remove('corner', from);
}

function insertTouching(draft: SurveyDraft, storeyId: string): boolean {
  const corners = draft.cornersOf(storeyId);
  const moved = draft.movedCorners();
  const movedCorners = corners.filter((corner) => moved.has(corner.id));
  let inserted = false;
  for (const room of draft.roomsOf(storeyId)) {
    const isNew = draft.hasNewOutline(room);
    const present = new Set(loopsOfRoom(room).flat());
    const settle = (loop: Loop): Loop => {
      const longer = ringEdges(loop).flatMap(([from, to]) => {
        const touched = isNew || moved.has(from) || moved.has(to);
        return [from, ...between(draft, from, to, touched ? corners : movedCorners, present)];
      });
      return longer.length === loop.length ? loop : longer;
    };
    const ring = settle(room.ring);
    const holes = room.holes.map(settle);
    if (ring === room.ring && holes.every((hole, index) => hole === room.holes[index])) continue;
    draft.put('room', { ...room, ring, holes } as Room);
    inserted = true;
  }
  return inserted;
}

/** Corners that lie on the wall, in the order they come along it; those the room visits already are left to the rules. */
function between(
  draft: SurveyDraft,
  from: string,
  to: string,
  corners: readonly Corner[],
  present: ReadonlySet<string>,
): string[] {
  const a = draft.get('corner', from);
  const b = draft.get('corner', to);
  if (a === undefined || b === undefined) return [];
  return corners
    .filter((corner) => !present.has(corner.id) && onSegment(corner, a, b))
    .map((corner) => ({ id: corner.id, t: nearestOnSegment(corner, a, b).t }))
    .sort((p, q) => p.t - q.t)
    .map(({ id }) => id);
}
