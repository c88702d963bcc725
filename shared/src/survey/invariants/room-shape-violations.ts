import { distance } from '../../geometry/distance.ts';
import type { Region, Ring } from '../../geometry/point.ts';
import { regionArea } from '../../geometry/region-area.ts';
import { ringEdges } from '../../geometry/ring-edges.ts';
import { selfCrossing } from '../../geometry/self-crossing.ts';
import { holesFit } from '../../geometry/holes-fit.ts';
import { signedArea } from '../../geometry/signed-area.ts';
import { ROUNDING_M } from '../../geometry/tolerance.ts';
import { clearRing } from '../derive/clear-ring.ts';
import { loopsOfRoom } from '../derive/loops-of-room.ts';
import { roomRegion } from '../derive/room-region.ts';
import type { Room, SurveyDocument } from '../survey-document.ts';
import { metres, nameOf, squareMetres } from '../words.ts';
import type { Violation } from './violation.ts';

/** The shortest wall between two corners, m. */
export const SHORTEST_WALL_M = 0.05;
/** The least floor of a room, m². */
export const LEAST_AREA_M2 = 0.25;
const LEAST = `the least is ${squareMetres(LEAST_AREA_M2)}`;

/** Regions found to be in order, with the wall thickness they were held against, m. */
const inOrder = new WeakMap<Region, number>();

/** What is wrong with one room by itself, its walls' thickness included: the first fault, or null. */
export function roomShapeViolation(document: SurveyDocument, room: Room): Violation | null {
  const region = roomRegion(document.corners, room);
  const thickness_m = document.storeys.get(room.storey_id)?.wall_thickness_m;
  if (region === null || thickness_m === undefined || inOrder.get(region) === thickness_m) return null;
  const violation = outlineViolation(document.corners, room) ?? floorViolation(document, room);
  if (violation === null) inOrder.set(region, thickness_m);
  return violation;
}

/** What is wrong with the outline of one room on its walls' centre lines: the first fault, or null. */
export function outlineViolation(corners: Pick<SurveyDocument['corners'], 'get'>, room: Room): Violation | null {
  const region = roomRegion(corners, room);
  if (region === null) return null;
  const at = faultOf(room);
  const loops = [region.ring, ...region.holes];
  for (const loop of loops) {
    const short = shortestEdge(loop);
    if (short < SHORTEST_WALL_M - ROUNDING_M) {
      const words = `A wall of room ${nameOf(room)} would be ${metres(short)} long; the shortest wall is ${metres(SHORTEST_WALL_M)}.`;
      return at('WALL_TOO_SHORT', words);
    }
  }
  const ids = loopsOfRoom(room).flat();
  if (new Set(ids).size < ids.length) {
    return at('ROOM_MEETS_ITSELF', `The outline of room ${nameOf(room)} would pass through the same corner twice.`);
  }
  for (const loop of loops) {
    const meeting = selfCrossing(loop);
    if (meeting === null) continue;
    if (meeting.touchAt === undefined)
      return at('ROOM_CROSSES_ITSELF', `The walls of room ${nameOf(room)} would cross.`);
    const { x_m, y_m } = meeting.touchAt;
    return at(
      'ROOM_MEETS_ITSELF',
      `The outline of room ${nameOf(room)} would meet itself at ${metres(x_m)}, ${metres(y_m)}.`,
    );
  }
  if (region.holes.some((hole) => signedArea(hole) === 0)) {
    return at('ROOM_TOO_SMALL', `A part cut out of room ${nameOf(room)} would have no area.`);
  }
  if (!holesFit(region)) {
    return at('HOLE_OUTSIDE_ROOM', `A part cut out of room ${nameOf(room)} would not lie wholly inside it.`);
  }
  const drawn_m2 = regionArea(region);
  if (drawn_m2 >= LEAST_AREA_M2 - ROUNDING_M) return null;
  return at('ROOM_TOO_SMALL', `Room ${nameOf(room)} would be ${squareMetres(drawn_m2)}; ${LEAST}.`);
}

function floorViolation(document: SurveyDocument, room: Room): Violation | null {
  const at = faultOf(room);
  const clear = clearRing(document, room.id);
  const thickness_m = document.storeys.get(room.storey_id)?.wall_thickness_m ?? 0;
  if (clear === null) {
    const words = `Room ${nameOf(room)} would be too narrow somewhere for walls ${metres(thickness_m)} thick.`;
    return at('ROOM_TOO_NARROW', words);
  }
  const clear_m2 = regionArea(clear);
  if (clear_m2 >= LEAST_AREA_M2 - ROUNDING_M) return null;
  const words = `Room ${nameOf(room)} would have ${squareMetres(clear_m2)} of floor between walls ${metres(thickness_m)} thick; ${LEAST}.`;
  return at('ROOM_TOO_SMALL', words);
}

function faultOf(room: Room): (code: string, message: string) => Violation {
  return (code, message) => ({ code, message, storeyId: room.storey_id, kind: 'room', ids: [room.id] });
}

function shortestEdge(loop: Ring): number {
  return Math.min(...ringEdges(loop).map(([a, b]) => distance(a, b)));
}
