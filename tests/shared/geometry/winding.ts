import type { Point, Ring } from '@embertally/shared/geometry/point';

/**
 * Inside or not by the winding number, summed from angles: another method than the one under test, and blind to places
 * very near an edge.
 */
export function windsRound(point: Point, ring: Ring): boolean {
  let turns = 0;
  for (const [index, a] of ring.entries()) {
    const b = ring[(index + 1) % ring.length] as Point;
    const from = Math.atan2(a.y_m - point.y_m, a.x_m - point.x_m);
    const to = Math.atan2(b.y_m - point.y_m, b.x_m - point.x_m);
    let turn = to - from;
    if (turn > Math.PI) turn -= 2 * Math.PI;
    if (turn < -Math.PI) turn += 2 * Math.PI;
    turns += turn;
  }
  return Math.abs(turns) > Math.PI;
}

/** Distance to the nearest edge, measured by stepping along every edge, m. */
export function stepsToEdge(point: Point, ring: Ring): number {
  let nearest = Infinity;
  for (const [index, a] of ring.entries()) {
    const b = ring[(index + 1) % ring.length] as Point;
    for (let t = 0; t <= 1; t += 0.005) {
      nearest = Math.min(
        nearest,
        Math.hypot(a.x_m + t * (b.x_m - a.x_m) - point.x_m, a.y_m + t * (b.y_m - a.y_m) - point.y_m),
      );
    }
  }
  return nearest;
}

export function ringOf(...corners: readonly (readonly [number, number])[]): Ring {
  return corners.map(([x_m, y_m]) => ({ x_m, y_m }));
}
