import { onSegment } from '../../geometry/on-segment.ts';
import { bounds, boundsOverlap } from '../../geometry/bounds.ts';
import { regionRelation } from '../../geometry/region-relation.ts';
import { segmentsCross } from '../../geometry/segments-cross.ts';
import { TOLERANCE_M } from '../../geometry/tolerance.ts';
import { roomRegion } from '../derive/room-region.ts';
import { roomsOfStorey } from '../derive/rooms-of-storey.ts';
import { walls } from '../derive/walls.ts';
import type { Corner, Room, SurveyDocument } from '../survey-document.ts';
import { listed, metres, nameOf } from '../words.ts';
import type { Violation } from './violation.ts';

interface Stretch {
  readonly a: Corner;
  readonly b: Corner;
  readonly minX_m: number;
  readonly maxX_m: number;
  readonly roomIds: readonly string[];
}

/** How the rooms of a storey lie against one another: no walls that cross or touch unjoined, no floor counted twice. */
export function planViolations(document: SurveyDocument, storeyId: string): Violation[] {
  const unjoined = wallViolation(document, storeyId);
  return unjoined === null ? overlapViolations(document, storeyId) : [unjoined];
}

/** Sweeps the walls from left to right and compares only those whose widths meet. */
function wallViolation(document: SurveyDocument, storeyId: string): Violation | null {
  const stretches = walls(document, storeyId)
    .map((wall): Stretch => {
      const a = document.corners.get(wall.a) as Corner;
      const b = document.corners.get(wall.b) as Corner;
      const [minX_m, maxX_m] = a.x_m < b.x_m ? [a.x_m, b.x_m] : [b.x_m, a.x_m];
      return { a, b, minX_m, maxX_m, roomIds: wall.roomIds };
    })
    .sort((p, q) => p.minX_m - q.minX_m);
  const reach = 2 * TOLERANCE_M;
  for (let i = 0; i < stretches.length; i += 1) {
    const p = stretches[i] as Stretch;
    for (let j = i + 1; j < stretches.length; j += 1) {
      const q = stretches[j] as Stretch;
      if (q.minX_m > p.maxX_m + reach) break;
      if (Math.min(q.a.y_m, q.b.y_m) > Math.max(p.a.y_m, p.b.y_m) + reach) continue;
      if (Math.min(p.a.y_m, p.b.y_m) > Math.max(q.a.y_m, q.b.y_m) + reach) continue;
      const violation = compare(document, storeyId, p, q);
      if (violation !== null) return violation;
    }
  }
  return null;
}

function compare(document: SurveyDocument, storeyId: string, p: Stretch, q: Stretch): Violation | null {
  const crosses = segmentsCross(p.a, p.b, q.a, q.b);
  const touch = crosses ? null : unjoinedCorner(p, q);
  if (!crosses && touch === null) return null;
  const ids = [...new Set([...p.roomIds, ...q.roomIds])];
  const rooms = listed(ids.map((id) => nameOf(document.rooms.get(id) as Room)));
  if (ids.length === 1) {
    const message = `The walls of room ${rooms} would meet where they share no corner.`;
    return { code: 'ROOM_CROSSES_ITSELF', message, storeyId, kind: 'room', ids };
  }
  if (crosses) {
    const message = `Rooms must not overlap, and walls of ${rooms} would cross.`;
    return { code: 'ROOM_OVERLAPS', message, storeyId, kind: 'room', ids };
  }
  const place = touch === null ? '' : ` at ${metres(touch.x_m)}, ${metres(touch.y_m)}`;
  const message = `Walls of ${rooms} meet${place} without sharing a corner.`;
  return { code: 'CORNER_NOT_SHARED', message, storeyId, kind: 'room', ids };
}

function unjoinedCorner(p: Stretch, q: Stretch): Corner | null {
  const loose = (corner: Corner, wall: Stretch): boolean =>
    corner !== wall.a && corner !== wall.b && onSegment(corner, wall.a, wall.b);
  for (const corner of [q.a, q.b]) if (loose(corner, p)) return corner;
  for (const corner of [p.a, p.b]) if (loose(corner, q)) return corner;
  return null;
}

function overlapViolations(document: SurveyDocument, storeyId: string): Violation[] {
  const rooms = roomsOfStorey(document, storeyId).flatMap((room) => {
    const region = roomRegion(document.corners, room);
    return region === null ? [] : [{ room, region, box: bounds(region.ring) }];
  });
  rooms.sort((a, b) => a.box.minX_m - b.box.minX_m);
  const found: Violation[] = [];
  for (let i = 0; i < rooms.length; i += 1) {
    const first = rooms[i] as (typeof rooms)[number];
    for (let j = i + 1; j < rooms.length; j += 1) {
      const second = rooms[j] as (typeof rooms)[number];
      if (second.box.minX_m >= first.box.maxX_m) break;
      if (!boundsOverlap(first.box, second.box)) continue;
      if (regionRelation(first.region, second.region) === 'apart') continue;
      const message = `Rooms must not overlap, and ${nameOf(first.room)} and ${nameOf(second.room)} would.`;
      found.push({ code: 'ROOM_OVERLAPS', message, storeyId, kind: 'room', ids: [first.room.id, second.room.id] });
    }
  }
  return found;
}
