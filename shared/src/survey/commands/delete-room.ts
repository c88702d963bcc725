import type { Command } from '../command.ts';
import { finishPlan } from '../draft/finish-plan.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { refuse } from '../refuse.ts';

export interface DeleteRoomInput {
  readonly room_id: string;
}

/** Takes a room away with its contents and the walls and openings nobody else has. Neighbours keep their corners. */
export const deleteRoom: Command<DeleteRoomInput> = (document, { room_id }) => {
  const room = document.rooms.get(room_id);
  if (room === undefined) return refuse('ROOM_GONE', 'The room is not in the survey any more.', { ids: [room_id] });
  const draft = new SurveyDraft(document);
  for (const entry of draft.entriesOf(room_id)) draft.remove('entry', entry.id);
  draft.remove('room', room_id);
  return finishPlan(draft, room.storey_id);
};
