import type { Room, SurveyDocument } from '../survey-document.ts';

/** Clear height of a room, m: its own, else the storey's; 0 when its storey is not there. */
export function roomHeight(document: SurveyDocument, room: Pick<Room, 'height_m' | 'storey_id'>): number {
  return room.height_m ?? document.storeys.get(room.storey_id)?.height_m ?? 0;
}
