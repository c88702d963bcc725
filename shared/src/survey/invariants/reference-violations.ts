import { loopsOfRoom } from '../derive/loops-of-room.ts';
import { openingsOfStorey } from '../derive/openings-of-storey.ts';
import { roomsOfStorey } from '../derive/rooms-of-storey.ts';
import { cornersOfStorey } from '../derive/corners-of-storey.ts';
import type { SurveyDocument } from '../survey-document.ts';
import { nameOf, openingWords } from '../words.ts';
import { wallsByKey } from '../derive/walls.ts';
import { wallKey } from '../derive/wall-key.ts';
import type { Violation } from './violation.ts';

/** Rows of a storey that name a row which is not there, or which nothing uses any more. */
export function referenceViolations(document: SurveyDocument, storeyId: string): Violation[] {
  const rooms = roomsOfStorey(document, storeyId);
  const corners = cornersOfStorey(document, storeyId);
  const openings = openingsOfStorey(document, storeyId);
  if (!document.storeys.has(storeyId)) {
    const [kind, row] = rooms[0] ? (['room', rooms[0]] as const) : (['corner', corners[0]] as const);
    const at = row?.id ?? openings[0]?.id;
    if (at === undefined) return [];
    const message = 'The storey this belongs to is not in the survey any more.';
    return [{ code: 'STOREY_GONE', message, storeyId, kind, ids: [at], missing: { kind: 'storey', id: storeyId } }];
  }
  const used = new Set<string>();
  const found: Violation[] = [];
  for (const room of rooms) {
    for (const id of loopsOfRoom(room).flat()) {
      used.add(id);
      if (document.corners.get(id)?.storey_id === storeyId) continue;
      const message = `A corner of room ${nameOf(room)} is not in the survey any more.`;
      const missing = { kind: 'corner', id } as const;
      found.push({ code: 'CORNER_GONE', message, storeyId, kind: 'room', ids: [room.id], missing });
    }
  }
  for (const corner of corners) {
    if (used.has(corner.id)) continue;
    const message = 'A corner belongs to no room.';
    found.push({ code: 'CORNER_UNUSED', message, storeyId, kind: 'corner', ids: [corner.id] });
  }
  for (const opening of openings) {
    if (wallsByKey(document, storeyId).has(wallKey(...opening.wall))) continue;
    const message = `The wall of the ${openingWords(opening)} is not there any more.`;
    found.push({ code: 'WALL_GONE', message, storeyId, kind: 'opening', ids: [opening.id] });
  }
  return found;
}
