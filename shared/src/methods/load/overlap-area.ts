import type { Ring } from '../../geometry/point.ts';

/** A convex ring of at most eight corners grows by at most one corner for each of the four cuts. */
const ROOM = 32;
let xs = new Float64Array(ROOM);
let ys = new Float64Array(ROOM);
let nextXs = new Float64Array(ROOM);
let nextYs = new Float64Array(ROOM);

/** Area of a rectangle turned off the axes inside an axis-parallel one, m². Works in fixed buffers: it runs often. */
export function overlapArea(ring: Ring, x0: number, y0: number, x1: number, y1: number): number {
  let n = ring.length;
  for (let i = 0; i < n; i += 1) {
    xs[i] = ring[i]!.x_m;
    ys[i] = ring[i]!.y_m;
  }
  n = cut(n, 1, 0, -x0);
  n = cut(n, -1, 0, x1);
  n = cut(n, 0, 1, -y0);
  n = cut(n, 0, -1, y1);
  let twice = 0;
  for (let i = 0; i < n; i += 1) {
    const j = (i + 1) % n;
    twice += xs[i]! * ys[j]! - xs[j]! * ys[i]!;
  }
  return Math.abs(twice) / 2;
}

/** Keeps the part of the buffered ring where a x + b y + c is not negative; returns its number of corners. */
function cut(n: number, a: number, b: number, c: number): number {
  let kept = 0;
  for (let i = 0; i < n; i += 1) {
    const j = (i + 1) % n;
    const from = a * xs[i]! + b * ys[i]! + c;
    const to = a * xs[j]! + b * ys[j]! + c;
    if (from >= 0) {
      nextXs[kept] = xs[i]!;
      nextYs[kept] = ys[i]!;
      kept += 1;
    }
    if (from >= 0 === to >= 0) continue;
    const t = from / (from - to);
    nextXs[kept] = xs[i]! + t * (xs[j]! - xs[i]!);
    nextYs[kept] = ys[i]! + t * (ys[j]! - ys[i]!);
    kept += 1;
  }
  [xs, nextXs] = [nextXs, xs];
  [ys, nextYs] = [nextYs, ys];
  return kept;
}
