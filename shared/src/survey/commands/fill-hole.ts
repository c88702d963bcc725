import type { Command } from '../command.ts';
import { finishPlan } from '../draft/finish-plan.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { refuse } from '../refuse.ts';

export interface FillHoleInput {
  readonly room_id: string;
  /** Any corner of the hole. */
  readonly corner_id: string;
}

/** Gives a room back the floor of a courtyard cut out of it. Refused while another room lies there. */
export const fillHole: Command<FillHoleInput> = (document, { room_id, corner_id }) => {
  const room = document.rooms.get(room_id);
  if (room === undefined) return refuse('ROOM_GONE', 'The room is not in the survey any more.', { ids: [room_id] });
  const holes = room.holes.filter((hole) => !hole.includes(corner_id));
  if (holes.length === room.holes.length) {
    return refuse('HOLE_GONE', 'That part is not cut out of the room any more.', { ids: [room_id] });
  }
  const draft = new SurveyDraft(document);
  draft.put('room', { ...room, holes });
  return finishPlan(draft, room.storey_id);
};
