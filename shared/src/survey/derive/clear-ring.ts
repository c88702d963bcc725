import type { Region } from '../../geometry/point.ts';
import type { Room, SurveyDocument } from '../survey-document.ts';
import { clearRegion } from './clear-region.ts';
import { roomRegion } from './room-region.ts';

const known = new WeakMap<Room, { corners: SurveyDocument['corners']; half_m: number; clear: Region | null }>();

/**
 * The clear inner ring of a room and the clear rings of its holes, m: the walls' centre lines less half the storey's wall
 * thickness. It gives the room's area, perimeter and volume. Null where no such ring exists (the room is not there, or
 * its walls leave no floor); no command leaves a room like that.
 */
export function clearRing(document: SurveyDocument, roomId: string): Region | null {
  const room = document.rooms.get(roomId);
  const storey = room && document.storeys.get(room.storey_id);
  if (room === undefined || storey === undefined) return null;
  const half_m = storey.wall_thickness_m / 2;
  const found = known.get(room);
  if (found !== undefined && found.corners === document.corners && found.half_m === half_m) return found.clear;
  const region = roomRegion(document.corners, room);
  const clear = region && clearRegion(region, half_m);
  known.set(room, { corners: document.corners, half_m, clear });
  return clear;
}
