import type { Region } from '../../geometry/point.ts';
import type { Corner, Room } from '../survey-document.ts';
import { loopsOfRoom } from './loops-of-room.ts';

type Outlined = Pick<Room, 'ring' | 'holes'>;

/** Regions by room. A region is good as long as every corner it was made of is the same row. */
const known = new WeakMap<Outlined, Region>();

/**
 * The room on its walls' centre lines, or null when a corner of it is not there. While neither the room nor any of its
 * corners changes, the very same region is given, so that what is found out about it can be kept with it.
 *
 * @param corners the document's corners, or those of a draft
 */
export function roomRegion(corners: Pick<ReadonlyMap<string, Corner>, 'get'>, room: Outlined): Region | null {
  const found = known.get(room);
  if (found !== undefined && isCurrent(found, corners, room)) return found;
  const places: Corner[][] = [];
  for (const loop of loopsOfRoom(room)) {
    const points: Corner[] = [];
    for (const id of loop) {
      const corner = corners.get(id);
      if (corner === undefined) return null;
      points.push(corner);
    }
    places.push(points);
  }
  const [ring = [], ...holes] = places;
  const region = { ring, holes };
  known.set(room, region);
  return region;
}

function isCurrent(region: Region, corners: Pick<ReadonlyMap<string, Corner>, 'get'>, room: Outlined): boolean {
  return (
    room.ring.every((id, index) => corners.get(id) === region.ring[index]) &&
    room.holes.every((hole, at) => hole.every((id, index) => corners.get(id) === region.holes[at]?.[index]))
  );
}
