import type { Region } from '../../geometry/point.ts';
import type { SurveyDocument } from '../survey-document.ts';
import { clearRegion } from './clear-region.ts';
import { roomRegion } from './room-region.ts';

const known = new WeakMap<Region, { readonly half_m: number; readonly clear: Region | null }>();

/**
 * The clear inner ring of a room and the clear rings of its holes, m: the walls' centre lines less half the storey's wall
 * thickness. It gives the room's area, perimeter and volume. Null where no such ring exists (the room is not there, or
 * its walls leave no floor); no command leaves a room like that.
 */
export function clearRing(document: SurveyDocument, roomId: string): Region | null {
  const room = document.rooms.get(roomId);
  const storey = room && document.storeys.get(room.storey_id);
  const region = room && roomRegion(document.corners, room);
  if (storey === undefined || region == null) return null;
  const half_m = storey.wall_thickness_m / 2;
  const found = known.get(region);
  if (found?.half_m === half_m) return found.clear;
  const clear = clearRegion(region, half_m);
  known.set(region, { half_m, clear });
  return clear;
}
