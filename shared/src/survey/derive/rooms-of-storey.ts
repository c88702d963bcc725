import { groupBy } from '../group-by.ts';
import type { Room, SurveyDocument } from '../survey-document.ts';

const grouped = groupBy<Room>((room) => room.storey_id);

/** The rooms of a storey, in the order they stand in the document. */
export function roomsOfStorey(document: SurveyDocument, storeyId: string): readonly Room[] {
  return grouped(document.rooms).get(storeyId) ?? [];
}
