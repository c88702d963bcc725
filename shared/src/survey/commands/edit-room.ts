import type { Command } from '../command.ts';
import { finish } from '../draft/finish.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { openingViolations } from '../invariants/opening-violations.ts';
import { refuse } from '../refuse.ts';
import { rowRefusal } from '../row-fault.ts';
import type { Room } from '../survey-document.ts';

export interface EditRoomInput {
  readonly room_id: string;
  /** The fields to change; the outline is changed by drawing. */
  readonly patch: Partial<Omit<Room, 'id' | 'storey_id' | 'ring' | 'holes'>>;
}

/** Changes what is known of a room. */
export const editRoom: Command<EditRoomInput> = (document, { room_id, patch }) => {
  const room = document.rooms.get(room_id);
  if (room === undefined) return refuse('ROOM_GONE', 'The room is not in the survey any more.', { ids: [room_id] });
  const edited = { ...room, ...patch };
  const fault = rowRefusal('room', edited);
  if (fault !== null) return fault;
  const draft = new SurveyDraft(document);
  draft.put('room', edited);
  return finish(draft, [], (outcome) =>
    patch.height_m === undefined ? [] : openingViolations(outcome, room.storey_id),
  );
};
