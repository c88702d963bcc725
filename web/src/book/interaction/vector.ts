import type { Point } from '@embertally/shared/geometry/point';

/** Arithmetic with points and directions on the plan, metres. */
export const plus = (a: Point, b: Point): Point => ({ x_m: a.x_m + b.x_m, y_m: a.y_m + b.y_m });
export const minus = (a: Point, b: Point): Point => ({ x_m: a.x_m - b.x_m, y_m: a.y_m - b.y_m });
export const times = (a: Point, k: number): Point => ({ x_m: a.x_m * k, y_m: a.y_m * k });
export const dot = (a: Point, b: Point): number => a.x_m * b.x_m + a.y_m * b.y_m;
export const length = (a: Point): number => Math.hypot(a.x_m, a.y_m);
export const middle = (a: Point, b: Point): Point => ({ x_m: (a.x_m + b.x_m) / 2, y_m: (a.y_m + b.y_m) / 2 });

/** Turns a direction anticlockwise by an angle in degrees. */
export function turned(a: Point, degrees: number): Point {
  const angle = (degrees * Math.PI) / 180;
  const cos = Math.cos(angle);
  const sin = Math.sin(angle);
  return { x_m: a.x_m * cos - a.y_m * sin, y_m: a.x_m * sin + a.y_m * cos };
}

/** The point a given distance from a towards b; a itself when the two coincide. */
export function towards(a: Point, b: Point, distance_m: number): Point {
  const span = length(minus(b, a));
  return span === 0 ? a : plus(a, times(minus(b, a), distance_m / span));
}
