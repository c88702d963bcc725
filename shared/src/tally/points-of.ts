import type { Point } from '../geometry/point.ts';

export type Pairs = readonly (readonly [number, number])[];

/** The points of a ring of `[x, y]` pairs. */
export function pointsOf(pairs: Pairs): Point[] {
  return pairs.map(([x_m, y_m]) => ({ x_m, y_m }));
}
