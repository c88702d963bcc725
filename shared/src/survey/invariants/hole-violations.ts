import { pointInRing } from '../../geometry/point-in-ring.ts';
import type { Region, Ring } from '../../geometry/point.ts';
import { roomRegion } from '../derive/room-region.ts';
import type { Room, SurveyDocument } from '../survey-document.ts';
import { nameOf } from '../words.ts';
import type { Violation } from './violation.ts';

/**
 * A part cut out of a room that does not lie inside the room, or lies inside another part cut out. Walls that cross or
 * touch are found elsewhere, so one corner of each hole decides.
 */
export function holeViolation(document: SurveyDocument, room: Room): Violation | null {
  const region = roomRegion(document.corners, room);
  if (region === null || region.holes.every((hole, index) => isWithin(hole, index, region))) return null;
  const message = `A part cut out of room ${nameOf(room)} would not lie inside it.`;
  return { code: 'HOLE_OUTSIDE_ROOM', message, storeyId: room.storey_id, kind: 'room', ids: [room.id], field: 'holes' };
}

function isWithin(hole: Ring, index: number, region: Region): boolean {
  const [corner] = hole;
  if (corner === undefined || pointInRing(corner, region.ring) !== 'inside') return false;
  return region.holes.every((other, at) => at === index || pointInRing(corner, other) === 'outside');
}
