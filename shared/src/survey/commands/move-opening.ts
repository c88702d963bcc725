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
import { openingWords } from '../words.ts';

export interface MoveOpeningInput {
  readonly opening_id: string;
  readonly wall: readonly [string, string];
  /** From the wall's first corner to the opening's near edge. */
  readonly offset_m: number;
}

/** Moves an opening along its wall or into another one of the storey. */
export const moveOpening: Command<MoveOpeningInput> = (document, { opening_id, wall, offset_m }) => {
  const opening = document.openings.get(opening_id);
  if (opening === undefined) {
    return refuse('OPENING_GONE', 'The opening is not in the survey any more.', { ids: [opening_id] });
  }
  if (!wallsByKey(document, opening.storey_id).has(wallKey(...wall))) {
    const message = `There is no wall there, so the ${openingWords(opening)} stays where it was.`;
    return refuse('WALL_GONE', message, { field: 'wall', ids: [opening_id] });
  }
  const moved = rounded({ ...opening, wall: [wall[0], wall[1]] as [string, string], offset_m }, OPENING_LENGTHS);
  const fault = rowRefusal('opening', moved);
  if (fault !== null) return fault;
  const draft = new SurveyDraft(document);
  draft.put('opening', moved);
  return finish(draft, [], (outcome) => openingFits(outcome, opening_id));
};
