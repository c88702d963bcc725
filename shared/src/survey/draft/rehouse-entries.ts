import { pointInRegion } from '../../geometry/point-in-region.ts';
import { roomRegion } from '../derive/room-region.ts';
import type { Room } from '../survey-document.ts';
import type { SurveyDraft } from './survey-draft.ts';

/** Entries of a room that stand on another's floor now go over to that room. */
export function rehouseEntries(draft: SurveyDraft, fromRoomId: string, to: Room): void {
  const region = roomRegion(draft.corners, to);
  if (region === null) return;
  for (const entry of draft.entriesOf(fromRoomId)) {
    if (pointInRegion(entry, region) === 'inside') draft.put('entry', { ...entry, room_id: to.id });
  }
}
