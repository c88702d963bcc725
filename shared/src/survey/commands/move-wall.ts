import type { Command } from '../command.ts';
import { wallRun } from '../derive/wall-run.ts';
import { finishPlan } from '../draft/finish-plan.ts';
import { moveCorners } from '../draft/move-corners.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { refuse } from '../refuse.ts';
import type { Corner } from '../survey-document.ts';

export interface MoveWallInput {
  readonly storey_id: string;
  /** The corners at both ends of any stretch of the wall. */
  readonly wall: readonly [string, string];
  readonly dx_m: number;
  readonly dy_m: number;
}

/** Moves a straight wall: every corner in its line goes along, the walls that end there grow or shrink. */
export const moveWall: Command<MoveWallInput> = (document, { storey_id, wall, dx_m, dy_m }) => {
  const run = wallRun(document, storey_id, wall);
  if (run.length === 0) return refuse('WALL_GONE', 'The wall is not in the survey any more.', { ids: [...wall] });
  const draft = new SurveyDraft(document);
  const places = run.map((id) => {
    const corner = document.corners.get(id) as Corner;
    return [id, { x_m: corner.x_m + dx_m, y_m: corner.y_m + dy_m }] as const;
  });
  const fault = moveCorners(draft, storey_id, new Map(places));
  return fault ?? finishPlan(draft, storey_id);
};
