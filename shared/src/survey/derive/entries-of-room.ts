import { groupBy } from '../group-by.ts';
import type { Entry, SurveyDocument } from '../survey-document.ts';

const grouped = groupBy<Entry>((entry) => entry.room_id);

/** The contents of a room, in the order they stand in the document. */
export function entriesOfRoom(document: SurveyDocument, roomId: string): readonly Entry[] {
  return grouped(document.entries).get(roomId) ?? [];
}
