import type { Command } from '../command.ts';
import { finish } from '../draft/finish.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { refuse } from '../refuse.ts';

export interface DeleteStoreyInput {
  readonly storey_id: string;
}

/** Takes a storey away with all its rooms, openings and contents. */
export const deleteStorey: Command<DeleteStoreyInput> = (document, { storey_id }) => {
  if (!document.storeys.has(storey_id)) {
    return refuse('STOREY_GONE', 'The storey is not in the survey any more.', { ids: [storey_id] });
  }
  const draft = new SurveyDraft(document);
  for (const room of draft.roomsOf(storey_id)) {
    for (const entry of draft.entriesOf(room.id)) draft.remove('entry', entry.id);
    draft.remove('room', room.id);
  }
  for (const opening of draft.openingsOf(storey_id)) draft.remove('opening', opening.id);
  for (const corner of draft.cornersOf(storey_id)) draft.remove('corner', corner.id);
  draft.remove('storey', storey_id);
  return finish(draft, []);
};
