import type { Command } from '../command.ts';
import { finishPlan } from '../draft/finish-plan.ts';
import { splice } from '../draft/splice.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { refuse } from '../refuse.ts';
import { rowRefusal } from '../row-fault.ts';
import type { Room } from '../survey-document.ts';
import { nameOf } from '../words.ts';

export interface JoinRoomsInput {
  /** The room that stays, with its name, use, linings and protection. */
  readonly room_id: string;
  /** The room that goes into it. */
  readonly other_id: string;
}

/**
 * Takes away the wall between two rooms. Contents, notes and photos of the other come along; openings in the wall go with
 * it; a measured floor area is kept only as the sum of two.
 */
export const joinRooms: Command<JoinRoomsInput> = (document, { room_id, other_id }) => {
  const room = document.rooms.get(room_id);
  const other = document.rooms.get(other_id);
  if (room === undefined || other === undefined) {
    const gone = room === undefined ? room_id : other_id;
    return refuse('ROOM_GONE', 'A room to join is not in the survey any more.', { ids: [gone] });
  }
  const about = { ids: [room_id, other_id] };
  if (room_id === other_id) return refuse('ROOMS_NOT_BESIDE', 'Choose two rooms to join.', about);
  const outline = room.storey_id === other.storey_id ? joined(room, other) : null;
  if (outline === null) {
    const message = `${nameOf(room)} and ${nameOf(other)} must share one stretch of wall to become one; rooms that meet in several places have something between them.`;
    return refuse('ROOMS_NOT_BESIDE', message, about);
  }
  const draft = new SurveyDraft(document);
  const areas = [room.measured_floor_area_m2, other.measured_floor_area_m2];
  const united: Room = {
    ...room,
    ...outline,
    measured_floor_area_m2: areas.reduce<number | null>(
      (sum, area) => (sum === null || area === null ? null : sum + area),
      0,
    ),
    notes: together(room.notes, other.notes),
    to_do: together(room.to_do, other.to_do),
    photos: [...room.photos, ...other.photos],
  };
  const fault = rowRefusal('room', united);
  if (fault !== null) return fault;
  draft.put('room', united);
  for (const entry of draft.entriesOf(other_id)) draft.put('entry', { ...entry, room_id });
  draft.remove('room', other_id);
  return finishPlan(draft, room.storey_id);
};

/** The outline round both: along a wall they share, or with the other filling a part that was cut out. */
function joined(room: Room, other: Room): Pick<Room, 'ring' | 'holes'> | null {
  const ring = splice(room.ring, other.ring);
  if (ring !== null) return { ring, holes: [...room.holes, ...other.holes] };
  for (const [outer, inner] of [
    [room, other],
    [other, room],
  ] as const) {
    const corners = new Set(inner.ring);
    const at = outer.holes.findIndex((hole) => hole.some((id) => corners.has(id)));
    const hole = outer.holes[at];
    if (hole === undefined) continue;
    const left = hole.every((id) => corners.has(id)) && hole.length === corners.size ? [] : splice(hole, inner.ring);
    if (left === null) return null;
    const holes = outer.holes.flatMap((one, index) => (index !== at ? [one] : left.length === 0 ? [] : [left]));
    return { ring: outer.ring, holes: [...holes, ...inner.holes] };
  }
  return null;
}

function together(a: string, b: string): string {
  return a === '' || b === '' ? a + b : `${a}\n${b}`;
}
