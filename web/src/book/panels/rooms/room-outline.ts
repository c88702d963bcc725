import { bounds } from '@embertally/shared/geometry/bounds';
import type { Point } from '@embertally/shared/geometry/point';
import { roomRegion } from '@embertally/shared/survey/derive/room-region';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';

export const SIDES = ['right', 'left', 'above', 'below'] as const;
export type Side = (typeof SIDES)[number];

/** The four corners of an upright rectangle, from its lower left corner, counter-clockwise. */
export function rectangle(x_m: number, y_m: number, width_m: number, depth_m: number): readonly Point[] {
  return [
    { x_m, y_m },
    { x_m: x_m + width_m, y_m },
    { x_m: x_m + width_m, y_m: y_m + depth_m },
    { x_m, y_m: y_m + depth_m },
  ];
}

/**
 * The lower left corner of a rectangle that shares a wall with a room: beside its right or left wall level with its
 * bottom, above or below it level with its left edge.
 *
 * @returns null when the room is not there
 */
export function besideRoom(
  document: SurveyDocument,
  roomId: string,
  side: Side,
  width_m: number,
  depth_m: number,
): Point | null {
  const room = document.rooms.get(roomId);
  const region = room && roomRegion(document.corners, room);
  if (region == null) return null;
  const box = bounds(region.ring);
  switch (side) {
    case 'right':
      return { x_m: box.maxX_m, y_m: box.minY_m };
    case 'left':
      return { x_m: box.minX_m - width_m, y_m: box.minY_m };
    case 'above':
      return { x_m: box.minX_m, y_m: box.maxY_m };
    case 'below':
      return { x_m: box.minX_m, y_m: box.minY_m - depth_m };
  }
}
