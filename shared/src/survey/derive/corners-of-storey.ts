import { groupBy } from '../group-by.ts';
import type { Corner, SurveyDocument } from '../survey-document.ts';

const grouped = groupBy<Corner>((corner) => corner.storey_id);

/** The corners of a storey. */
export function cornersOfStorey(document: SurveyDocument, storeyId: string): readonly Corner[] {
  return grouped(document.corners).get(storeyId) ?? [];
}
