import { groupBy } from '../group-by.ts';
import type { Opening, SurveyDocument } from '../survey-document.ts';

const grouped = groupBy<Opening>((opening) => opening.storey_id);

/** The openings of a storey. */
export function openingsOfStorey(document: SurveyDocument, storeyId: string): readonly Opening[] {
  return grouped(document.openings).get(storeyId) ?? [];
}
