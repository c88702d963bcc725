import type { Command } from '../command.ts';
import { finishPlan } from '../draft/finish-plan.ts';
import { moveCorners } from '../draft/move-corners.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { refuse } from '../refuse.ts';

export interface MoveCornerInput {
  readonly corner_id: string;
  readonly x_m: number;
  readonly y_m: number;
}

/** Moves one corner, and with it every wall that ends there. Put on another corner or wall, it joins it. */
export const moveCorner: Command<MoveCornerInput> = (document, { corner_id, x_m, y_m }) => {
  const corner = document.corners.get(corner_id);
  if (corner === undefined)
    return refuse('CORNER_GONE', 'The corner is not in the survey any more.', { ids: [corner_id] });
  const draft = new SurveyDraft(document);
  const fault = moveCorners(draft, corner.storey_id, new Map([[corner_id, { x_m, y_m }]]));
  return fault ?? finishPlan(draft, corner.storey_id);
};
