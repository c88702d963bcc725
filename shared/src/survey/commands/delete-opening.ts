import type { Command } from '../command.ts';
import { finish } from '../draft/finish.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { refuse } from '../refuse.ts';

export interface DeleteOpeningInput {
  readonly opening_ids: readonly string[];
}

/** Takes openings out of their walls. */
export const deleteOpening: Command<DeleteOpeningInput> = (document, { opening_ids }) => {
  const draft = new SurveyDraft(document);
  for (const id of opening_ids) {
    if (!document.openings.has(id))
      return refuse('OPENING_GONE', 'The opening is not in the survey any more.', { ids: [id] });
    draft.remove('opening', id);
  }
  return finish(draft, []);
};
