import type { Point } from './point.ts';

/** The place where two segments meet, ends included; null when they are parallel or miss one another. */
export function segmentIntersection(a: Point, b: Point, c: Point, d: Point): Point | null {
  const rx = b.x_m - a.x_m;
  const ry = b.y_m - a.y_m;
  const sx = d.x_m - c.x_m;
  const sy = d.y_m - c.y_m;
  const cross = rx * sy - ry * sx;
  if (cross === 0) return null;
  const t = ((c.x_m - a.x_m) * sy - (c.y_m - a.y_m) * sx) / cross;
  const u = ((c.x_m - a.x_m) * ry - (c.y_m - a.y_m) * rx) / cross;
  if (t < 0 || t > 1 || u < 0 || u > 1) return null;
  return { x_m: a.x_m + t * rx, y_m: a.y_m + t * ry };
}
