import type { Command } from '../command.ts';
import { wallKey } from '../derive/wall-key.ts';
import { wallsByKey } from '../derive/walls.ts';
import { finish } from '../draft/finish.ts';
import { rounded } from '../draft/rounded.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { openingFits } from '../invariants/opening-violations.ts';
import { OPENING_LENGTHS } from '../opening-lengths.ts';
import { refuse } from '../refuse.ts';
import { rowRefusal } from '../row-fault.ts';
import type { Opening } from '../survey-document.ts';

export interface AddOpeningInput {
  /** As `newOpening` makes it. */
  readonly opening: Opening;
}

/** Puts an opening in a wall. */
export const addOpening: Command<AddOpeningInput> = (document, input) => {
  const opening = rounded(input.opening, OPENING_LENGTHS);
  if (document.openings.has(opening.id))
    return refuse('OPENING_EXISTS', 'This opening is there already.', { ids: [opening.id] });
  const fault = rowRefusal('opening', opening);
  if (fault !== null) return fault;
  if (!wallsByKey(document, opening.storey_id).has(wallKey(...opening.wall))) {
    return refuse('WALL_GONE', `The wall for the ${opening.kind} is not there any more.`, { field: 'wall' });
  }
  const draft = new SurveyDraft(document);
  draft.put('opening', opening);
  return finish(draft, [opening.storey_id], (outcome) => openingFits(outcome, opening.id));
};
