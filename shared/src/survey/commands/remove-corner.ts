import { distance } from '../../geometry/distance.ts';
import { onSegment } from '../../geometry/on-segment.ts';
import { ringEdges } from '../../geometry/ring-edges.ts';
import { roundToMillimetre } from '../../geometry/round-to-millimetre.ts';
import type { Command } from '../command.ts';
import { loopsOfRoom } from '../derive/loops-of-room.ts';
import { finishPlan } from '../draft/finish-plan.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { refuse } from '../refuse.ts';
import type { Corner } from '../survey-document.ts';
import { nameOf } from '../words.ts';

export interface RemoveCornerInput {
  readonly corner_id: string;
}

/**
 * Takes a corner out; its two walls become one. Their openings stay when the wall was straight there, and go with the
 * walls when it was not. A corner where another wall ends cannot go.
 */
export const removeCorner: Command<RemoveCornerInput> = (document, { corner_id }) => {
  const corner = document.corners.get(corner_id);
  if (corner === undefined)
    return refuse('CORNER_GONE', 'The corner is not in the survey any more.', { ids: [corner_id] });
  const draft = new SurveyDraft(document);
  const rooms = draft.roomsOf(corner.storey_id).filter((room) => loopsOfRoom(room).flat().includes(corner_id));
  const beside = new Set<string>();
  for (const [from, to] of rooms.flatMap((room) => loopsOfRoom(room).flatMap((loop) => ringEdges(loop)))) {
    if (from === corner_id) beside.add(to);
    if (to === corner_id) beside.add(from);
  }
  const [a, b, third] = [...beside].map((id) => document.corners.get(id));
  if (a === undefined || b === undefined || third !== undefined) {
    const message = 'Another wall ends at this corner; take that wall away first.';
    return refuse('CORNER_HOLDS_WALLS', message, { ids: [corner_id] });
  }
  const triangle = rooms.find((room) =>
    loopsOfRoom(room).some((loop) => loop.length === 3 && loop.includes(corner_id)),
  );
  if (triangle !== undefined) {
    const message = `Room ${nameOf(triangle)} has only three corners there and needs them.`;
    return refuse('ROOM_TOO_FEW_CORNERS', message, { ids: [corner_id, triangle.id] });
  }
  const without = (loop: readonly string[]): string[] => loop.filter((id) => id !== corner_id);
  for (const room of rooms) {
    draft.put('room', { ...room, ring: without(room.ring), holes: room.holes.map(without) });
  }
  if (onSegment(corner, a, b)) joinOpenings(draft, corner, a, b);
  draft.remove('corner', corner_id);
  return finishPlan(draft, corner.storey_id);
};

/** Counts the offsets of the openings in both halves from the first end of the joined wall. */
function joinOpenings(draft: SurveyDraft, corner: Corner, a: Corner, b: Corner): void {
  const first_m = distance(a, corner);
  const second_m = distance(corner, b);
  for (const opening of draft.openingsOf(corner.storey_id)) {
    const [from, to] = opening.wall;
    if (from !== corner.id && to !== corner.id) continue;
    const inFirst = from === a.id || to === a.id;
    const length_m = inFirst ? first_m : second_m;
    const towardsB = from === a.id || to === b.id;
    const along_m = towardsB ? opening.offset_m : length_m - opening.offset_m - opening.width_m;
    const offset_m = Math.max(0, roundToMillimetre((inFirst ? 0 : first_m) + along_m));
    draft.put('opening', { ...opening, wall: [a.id, b.id], offset_m });
  }
}
