import type { Ring } from './point.ts';

export interface Bounds {
  readonly minX_m: number;
  readonly minY_m: number;
  readonly maxX_m: number;
  readonly maxY_m: number;
}

/** The smallest upright rectangle around the points, m. No points: an empty rectangle that overlaps nothing. */
export function bounds(points: Ring): Bounds {
  let minX_m = Infinity;
  let minY_m = Infinity;
  let maxX_m = -Infinity;
  let maxY_m = -Infinity;
  for (const { x_m, y_m } of points) {
    if (x_m < minX_m) minX_m = x_m;
    if (x_m > maxX_m) maxX_m = x_m;
    if (y_m < minY_m) minY_m = y_m;
    if (y_m > maxY_m) maxY_m = y_m;
  }
  return { minX_m, minY_m, maxX_m, maxY_m };
}

/** Whether two upright rectangles share more than an edge. */
export function boundsOverlap(a: Bounds, b: Bounds): boolean {
  return a.minX_m < b.maxX_m && b.minX_m < a.maxX_m && a.minY_m < b.maxY_m && b.minY_m < a.maxY_m;
}
