import type { Region } from '../../geometry/point.ts';
import type { Corner, Room } from '../survey-document.ts';

/**
 * The room on its walls' centre lines, or null when a corner of it is not there.
 *
 * @param corners the document's corners, or those of a draft
 */
export function roomRegion(
  corners: Pick<ReadonlyMap<string, Corner>, 'get'>,
  room: Pick<Room, 'ring' | 'holes'>,
): Region | null {
  let complete = true;
  const places = (loop: readonly string[]): Corner[] =>
    loop.flatMap((id) => {
      const corner = corners.get(id);
      if (corner === undefined) complete = false;
      return corner ?? [];
    });
  const region = { ring: places(room.ring), holes: room.holes.map(places) };
  return complete ? region : null;
}
