import type { Command } from '../command.ts';
import { finish } from '../draft/finish.ts';
import { rounded } from '../draft/rounded.ts';
import { SurveyDraft } from '../draft/survey-draft.ts';
import { refuse } from '../refuse.ts';
import { rowRefusal } from '../row-fault.ts';
import type { Storey } from '../survey-document.ts';

export interface EditStoreyInput {
  readonly storey_id: string;
  readonly patch: Partial<Omit<Storey, 'id'>>;
}

/** Changes a storey. Refused where thicker walls or a lower ceiling leave a room without floor or cut an opening off. */
export const editStorey: Command<EditStoreyInput> = (document, { storey_id, patch }) => {
  const storey = document.storeys.get(storey_id);
  if (storey === undefined)
    return refuse('STOREY_GONE', 'The storey is not in the survey any more.', { ids: [storey_id] });
  const edited = rounded({ ...storey, ...patch }, ['level_m', 'height_m', 'wall_thickness_m']);
  const fault = rowRefusal('storey', edited);
  if (fault !== null) return fault;
  const draft = new SurveyDraft(document);
  draft.put('storey', edited);
  const measures = edited.height_m !== storey.height_m || edited.wall_thickness_m !== storey.wall_thickness_m;
  return finish(draft, measures ? [storey_id] : []);
};
