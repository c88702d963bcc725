import { ringEdges } from '../../geometry/ring-edges.ts';
import type { Opening, SurveyDocument } from '../survey-document.ts';
import { loopsOfRoom } from './loops-of-room.ts';
import { openingsOfStorey } from './openings-of-storey.ts';
import { wallKey } from './wall-key.ts';

/** The openings in a room's walls; one in a wall between two rooms belongs to both. */
export function openingsOfRoom(document: SurveyDocument, roomId: string): readonly Opening[] {
  const room = document.rooms.get(roomId);
  if (room === undefined) return [];
  const edges = new Set(loopsOfRoom(room).flatMap((loop) => ringEdges(loop).map(([a, b]) => wallKey(a, b))));
  return openingsOfStorey(document, room.storey_id).filter((opening) => edges.has(wallKey(...opening.wall)));
}
