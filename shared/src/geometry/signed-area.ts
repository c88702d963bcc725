import type { Point, Ring } from './point.ts';

/**
 * Area of a ring, m²: positive when it runs counter-clockwise, negative when clockwise, 0 for fewer than three corners.
 * Shoelace formula taken from the first corner, so a small room far from the origin keeps its digits.
 */
export function signedArea(ring: Ring): number {
  const origin = ring[0];
  if (origin === undefined) return 0;
  let twice = 0;
  let previous: Point = origin;
  for (const point of ring) {
    twice +=
      (previous.x_m - origin.x_m) * (point.y_m - origin.y_m) - (point.x_m - origin.x_m) * (previous.y_m - origin.y_m);
    previous = point;
  }
  return twice / 2;
}
