import { onSegment } from './on-segment.ts';
import type { Point, Ring } from './point.ts';
import { ringEdges } from './ring-edges.ts';

export type Whereabouts = 'inside' | 'on' | 'outside';

/** Where a place lies against a ring: `on` within the plan's tolerance of an edge, else by the even–odd rule. */
export function pointInRing(point: Point, ring: Ring): Whereabouts {
  let inside = false;
  for (const [a, b] of ringEdges(ring)) {
    if (onSegment(point, a, b)) return 'on';
    // Half-open in y, so a ray through a corner is counted once.
    if (a.y_m > point.y_m !== b.y_m > point.y_m) {
      const crossing = a.x_m + ((point.y_m - a.y_m) / (b.y_m - a.y_m)) * (b.x_m - a.x_m);
      if (point.x_m < crossing) inside = !inside;
    }
  }
  return inside ? 'inside' : 'outside';
}
