import type { Point } from './point.ts';

/** Straight distance between two places, m. */
export function distance(a: Point, b: Point): number {
  return Math.hypot(b.x_m - a.x_m, b.y_m - a.y_m);
}
