import type { Command } from '../command.ts';
import { finish } from '../draft/finish.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { refuse } from '../refuse.ts';
import { rowRefusal } from '../row-fault.ts';
import type { Storey } from '../survey-document.ts';

export interface AddStoreyInput {
  /** As `newStorey` makes it. */
  readonly storey: Storey;
}

/** Adds a storey to draw on. */
export const addStorey: Command<AddStoreyInput> = (document, { storey }) => {
  if (document.storeys.has(storey.id))
    return refuse('STOREY_EXISTS', 'This storey is there already.', { ids: [storey.id] });
  const fault = rowRefusal('storey', storey);
  if (fault !== null) return fault;
  const draft = new SurveyDraft(document);
  draft.put('storey', storey);
  return finish(draft, []);
};
