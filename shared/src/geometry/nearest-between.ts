import { distance } from './distance.ts';
import { nearestOnSegment } from './nearest-on-segment.ts';
import type { Point, Ring } from './point.ts';
import { ringEdges } from './ring-edges.ts';

/** Distances that differ by less are the same, m. */
const SAME_M = 1e-9;

interface Nearest {
  readonly a: Point;
  readonly b: Point;
  readonly distance_m: number;
}

/**
 * The two places, one on each of two convex rings, that lie nearest to each other, m. Where edges run side by side every
 * place of the stretch they share would do: it is the middle of it. Rings that cross still answer with places on their
 * edges.
 */
export function nearestBetween(a: Ring, b: Ring): Nearest {
  const found = [
    ...cornersToEdges(a, b),
    ...cornersToEdges(b, a).map((near): Nearest => ({ a: near.b, b: near.a, distance_m: near.distance_m })),
  ];
  const least_m = Math.min(...found.map(({ distance_m }) => distance_m));
  const best = found.filter(({ distance_m }) => distance_m - least_m < SAME_M);
  const middle = { a: mean(best.map((near) => near.a)), b: mean(best.map((near) => near.b)) };
  return { ...middle, distance_m: distance(middle.a, middle.b) };
}

function cornersToEdges(corners: Ring, edges: Ring): readonly Nearest[] {
  return corners.flatMap((corner) =>
    ringEdges(edges).map(([from, to]): Nearest => {
      const { point, distance_m } = nearestOnSegment(corner, from, to);
      return { a: corner, b: point, distance_m };
    }),
  );
}

function mean(points: readonly Point[]): Point {
  const [x_m, y_m] = points.reduce(([x, y], point) => [x + point.x_m, y + point.y_m], [0, 0]);
  return { x_m: x_m / points.length, y_m: y_m / points.length };
}
