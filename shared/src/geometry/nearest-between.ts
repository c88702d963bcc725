import { distance } from './distance.ts';
import { nearestOnSegment } from './nearest-on-segment.ts';
import type { Point, Ring } from './point.ts';
import { ringEdges } from './ring-edges.ts';

/**
 * The two places, one on each ring, that lie nearest to each other, m. Rings that cross or contain one another still
 * answer with the nearest places of their edges.
 */
export function nearestBetween(
  a: Ring,
  b: Ring,
): { readonly a: Point; readonly b: Point; readonly distance_m: number } {
  let best = { a: a[0]!, b: b[0]!, distance_m: Infinity };
  for (const corner of a) {
    for (const [from, to] of ringEdges(b)) {
      const { point, distance_m } = nearestOnSegment(corner, from, to);
      if (distance_m < best.distance_m) best = { a: corner, b: point, distance_m };
    }
  }
  for (const corner of b) {
    for (const [from, to] of ringEdges(a)) {
      const { point } = nearestOnSegment(corner, from, to);
      const distance_m = distance(point, corner);
      if (distance_m < best.distance_m) best = { a: point, b: corner, distance_m };
    }
  }
  return best;
}
