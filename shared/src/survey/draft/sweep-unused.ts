import { loopsOfRoom } from '../derive/loops-of-room.ts';
import type { SurveyDraft } from './survey-draft.ts';

/** Takes out the corners of a storey that no room visits any more. */
export function sweepUnused(draft: SurveyDraft, storeyId: string): void {
  const used = new Set(draft.roomsOf(storeyId).flatMap((room) => loopsOfRoom(room).flat()));
  for (const corner of draft.cornersOf(storeyId)) if (!used.has(corner.id)) draft.remove('corner', corner.id);
}
