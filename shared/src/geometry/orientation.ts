import type { Point } from './point.ts';

/**
 * Which way a → b → c turns: 1 to the left (counter-clockwise), −1 to the right, 0 straight.
 *
 * Exact for places on the 1 mm grid within ±10,000 m: twice the triangle's area is then a whole number of mm², its
 * rounding error in double precision stays below half a mm², and rounding to the mm² restores it. This is why the plan
 * needs no arbitrary-precision predicates.
 */
export function orientation(a: Point, b: Point, c: Point): -1 | 0 | 1 {
  const twice_m2 = (b.x_m - a.x_m) * (c.y_m - a.y_m) - (b.y_m - a.y_m) * (c.x_m - a.x_m);
  const twice_mm2 = Math.round(twice_m2 * 1e6);
  if (twice_mm2 > 0) return 1;
  return twice_mm2 < 0 ? -1 : 0;
}
