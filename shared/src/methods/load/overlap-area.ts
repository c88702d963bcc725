import type { Point, Ring } from '../../geometry/point.ts';
import { signedArea } from '../../geometry/signed-area.ts';

/** Area of a convex ring inside an axis-parallel rectangle, m². */
export function overlapArea(ring: Ring, x0: number, y0: number, x1: number, y1: number): number {
  let clipped: Ring = ring;
  clipped = clip(clipped, (p) => p.x_m - x0);
  clipped = clip(clipped, (p) => x1 - p.x_m);
  clipped = clip(clipped, (p) => p.y_m - y0);
  clipped = clip(clipped, (p) => y1 - p.y_m);
  return clipped.length < 3 ? 0 : Math.abs(signedArea(clipped));
}

/** The part of a convex ring on the side of a line where `side` is not negative. */
function clip(ring: Ring, side: (point: Point) => number): Point[] {
  return ring.flatMap((from, i) => {
    const to = ring[(i + 1) % ring.length]!;
    const [a, b] = [side(from), side(to)];
    const kept = a >= 0 ? [from] : [];
    if (a >= 0 === b >= 0) return kept;
    const t = a / (a - b);
    return [...kept, { x_m: from.x_m + t * (to.x_m - from.x_m), y_m: from.y_m + t * (to.y_m - from.y_m) }];
  });
}
