import type { Command } from '../command.ts';
import { finish } from '../draft/finish.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { refuse } from '../refuse.ts';

export interface DeleteEntriesInput {
  readonly entry_ids: readonly string[];
}

/** Takes entries out of the contents. */
export const deleteEntries: Command<DeleteEntriesInput> = (document, { entry_ids }) => {
  const draft = new SurveyDraft(document);
  for (const id of entry_ids) {
    if (!document.entries.has(id))
      return refuse('ENTRY_GONE', 'The entry is not in the survey any more.', { ids: [id] });
    draft.remove('entry', id);
  }
  return finish(draft, []);
};
