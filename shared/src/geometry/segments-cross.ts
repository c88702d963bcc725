import { orientation } from './orientation.ts';
import type { Point } from './point.ts';

/**
 * Whether two segments cross in one place that is an end of neither. Segments that only touch, share an end or lie
 * along one another do not cross. Exact on the 1 mm grid.
 */
export function segmentsCross(a: Point, b: Point, c: Point, d: Point): boolean {
  if (orientation(a, b, c) * orientation(a, b, d) >= 0) return false;
  return orientation(c, d, a) * orientation(c, d, b) < 0;
}
