import type { Command } from '../command.ts';
import { finish } from '../draft/finish.ts';
import { rounded } from '../draft/rounded.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { openingFits } from '../invariants/opening-violations.ts';
import { OPENING_LENGTHS } from '../opening-lengths.ts';
import { refuse } from '../refuse.ts';
import { rowRefusal } from '../row-fault.ts';
import type { Opening } from '../survey-document.ts';

export interface EditOpeningInput {
  readonly opening_id: string;
  readonly patch: Partial<Omit<Opening, 'id' | 'storey_id' | 'wall'>>;
}

/** Changes the size, kind, state or place along its wall of an opening. */
export const editOpening: Command<EditOpeningInput> = (document, { opening_id, patch }) => {
  const opening = document.openings.get(opening_id);
  if (opening === undefined) {
    return refuse('OPENING_GONE', 'The opening is not in the survey any more.', { ids: [opening_id] });
  }
  const edited = rounded({ ...opening, ...patch }, OPENING_LENGTHS);
  const fault = rowRefusal('opening', edited);
  if (fault !== null) return fault;
  const draft = new SurveyDraft(document);
  draft.put('opening', edited);
  return finish(draft, [], (outcome) => openingFits(outcome, opening_id));
};
