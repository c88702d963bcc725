import type { Point } from '../../geometry/point.ts';
import { regionRelation } from '../../geometry/region-relation.ts';
import { roundToMillimetre } from '../../geometry/round-to-millimetre.ts';
import type { Command, Refusal } from '../command.ts';
import { nextRoomName } from '../derive/next-room-name.ts';
import { roomRegion } from '../derive/room-region.ts';
import { cutOut } from '../draft/cut-out.ts';
import { finish } from '../draft/finish.ts';
import { rehangOpenings } from '../draft/rehang-openings.ts';
import { rehouseEntries } from '../draft/rehouse-entries.ts';
import { settleCorners } from '../draft/settle-corners.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { sweepUnused } from '../draft/sweep-unused.ts';
import { outlineViolation } from '../invariants/room-shape-violations.ts';
import { newRoom } from '../new-room.ts';
import { refuse } from '../refuse.ts';
import { rowRefusal } from '../row-fault.ts';
import type { Room } from '../survey-document.ts';
import { listed, nameOf } from '../words.ts';

export interface DrawRoomInput {
  readonly room_id: string;
  readonly storey_id: string;
  /** Left out: the next free "Room n". */
  readonly name?: string;
  /** The outline on wall centre lines, either way round, not closed by a repeated point. */
  readonly points: readonly Point[];
  /** One new id per point; those of points that fall on a corner already there stay unused. */
  readonly corner_ids: readonly string[];
  /** Answer to `ROOM_INSIDE_ROOM` and `ROOM_AROUND_ROOM`: take the inner room's floor out of the outer room. */
  readonly cut_out?: boolean;
  /** What is known of the room already. */
  readonly room?: Partial<Omit<Room, 'id' | 'storey_id' | 'name' | 'ring' | 'holes'>>;
}

/** Draws a room. Its corners join corners and walls already there; contents standing on a part cut out come with it. */
export const drawRoom: Command<DrawRoomInput> = (document, input) => {
  const { storey_id, room_id } = input;
  if (!document.storeys.has(storey_id))
    return refuse('STOREY_GONE', 'The storey to draw on is not in the survey any more.');
  if (document.rooms.has(room_id)) return refuse('ROOM_EXISTS', 'This room is drawn already.', { ids: [room_id] });
  if (input.points.length < 3)
    return refuse('ROOM_TOO_FEW_CORNERS', 'A room needs at least three corners.', { field: 'points' });

  const draft = new SurveyDraft(document);
  const ring = input.points.map((_, index) => input.corner_ids[index] ?? '');
  for (const [index, point] of input.points.entries()) {
    const x_m = roundToMillimetre(point.x_m);
    const y_m = roundToMillimetre(point.y_m);
    const corner = { id: ring[index] as string, storey_id, x_m, y_m };
    const fault = rowRefusal('corner', corner);
    if (fault !== null) return fault;
    draft.put('corner', corner);
  }
  const name = input.name ?? nextRoomName(document);
  const drawn = newRoom({ ...input.room, id: room_id, storey_id, name, ring });
  const fault = rowRefusal('room', drawn);
  if (fault !== null) return fault;
  draft.put('room', drawn);

  settleCorners(draft, storey_id);
  const settled = draft.get('room', room_id) as Room;
  const violation = outlineViolation(draft.corners, settled);
  if (violation !== null) return refuse(violation.code, violation.message, { field: 'points', ids: [] });
  const overlap = placeAmongRooms(draft, settled, input.cut_out === true);
  if (overlap !== null) return overlap;
  const hangs = rehangOpenings(draft, storey_id);
  if (hangs !== null) return hangs;
  sweepUnused(draft, storey_id);
  return finish(draft, [storey_id]);
};

/** Cuts the new room out of the room it lies in, or the rooms it goes round out of it, when that is wanted. */
function placeAmongRooms(draft: SurveyDraft, drawn: Room, cut: boolean): Refusal | null {
  const inside: Room[] = [];
  const around: Room[] = [];
  const overlapped: Room[] = [];
  const region = roomRegion(draft.corners, drawn);
  for (const other of draft.roomsOf(drawn.storey_id)) {
    const otherRegion = other.id === drawn.id ? null : roomRegion(draft.corners, other);
    if (region === null || otherRegion === null) continue;
    const relation = regionRelation(region, otherRegion);
    if (relation === 'inside') inside.push(other);
    else if (relation === 'around') around.push(other);
    else if (relation === 'overlap') overlapped.push(other);
  }
  if (overlapped.length > 0) {
    const message = `Rooms must not overlap, and this one would lie over ${listed(overlapped.map(nameOf))}.`;
    return refuse('ROOM_OVERLAPS', message, { field: 'points', ids: overlapped.map((room) => room.id) });
  }
  if (inside.length > 0 && !cut) {
    const message = `This outline lies inside ${listed(inside.map(nameOf))}. It can be cut out of that room and become one of its own.`;
    return refuse('ROOM_INSIDE_ROOM', message, { field: 'cut_out', ids: inside.map((room) => room.id) });
  }
  if (around.length > 0 && !cut) {
    const message = `This outline goes round ${listed(around.map(nameOf))}. The floor there can be left out of the new room.`;
    return refuse('ROOM_AROUND_ROOM', message, { field: 'cut_out', ids: around.map((room) => room.id) });
  }
  for (const outer of inside) {
    const outline = cutOut(outer, drawn.ring);
    if (outline === null) return wouldSplit(outer);
    draft.put('room', { ...outer, ...outline });
    rehouseEntries(draft, outer.id, drawn);
  }
  for (const inner of around) {
    const outline = cutOut(draft.get('room', drawn.id) as Room, inner.ring);
    if (outline === null) return wouldSplit(inner);
    draft.put('room', { ...drawn, ...outline });
  }
  return null;
}

function wouldSplit(room: Room): Refusal {
  const message = `Cutting this out would part the floor of ${nameOf(room)} or leave two parts that touch in one corner; draw the parts as rooms of their own.`;
  return refuse('ROOM_WOULD_SPLIT', message, { field: 'points', ids: [room.id] });
}
