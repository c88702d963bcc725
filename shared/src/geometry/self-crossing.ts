import { distance } from './distance.ts';
import { onSegment } from './on-segment.ts';
import type { Point, Ring } from './point.ts';
import { ringEdges } from './ring-edges.ts';
import { segmentsCross } from './segments-cross.ts';
import { ROUNDING_M, TOLERANCE_M } from './tolerance.ts';

export interface SelfCrossing {
  /** Indices of the two edges that meet; edge i runs from corner i to the next. */
  readonly edges: readonly [number, number];
  /** A corner that lies on the other edge, when they touch and do not cross. */
  readonly touchAt?: Point;
}

/**
 * The first pair of edges of a ring that cross, touch (within the plan's tolerance) or run back over one another; null
 * for a ring that meets itself nowhere. Neighbouring edges may share their corner only.
 */
export function selfCrossing(ring: Ring): SelfCrossing | null {
  const edges = ringEdges(ring);
  for (let i = 0; i < edges.length; i += 1) {
    const [a, b] = edges[i] as [Point, Point];
    for (let j = i + 1; j < edges.length; j += 1) {
      const [c, d] = edges[j] as [Point, Point];
      const next = j === i + 1;
      const previous = i === 0 && j === edges.length - 1;
      const touchAt = next || previous ? touchBesideCorner(a, b, c, d, next) : touchOf(a, b, c, d);
      if (touchAt !== null) return { edges: [i, j], touchAt };
      if (segmentsCross(a, b, c, d)) return { edges: [i, j] };
    }
  }
  return null;
}

function touchOf(a: Point, b: Point, c: Point, d: Point): Point | null {
  if (onSegment(c, a, b)) return c;
  if (onSegment(d, a, b)) return d;
  if (onSegment(a, c, d)) return a;
  return onSegment(b, c, d) ? b : null;
}

/** Neighbours share one corner; they meet elsewhere only when one folds back over the other. */
function touchBesideCorner(a: Point, b: Point, c: Point, d: Point, next: boolean): Point | null {
  const [first, shared, last] = next ? [a, b, d] : [b, a, c];
  const reach = TOLERANCE_M + ROUNDING_M;
  if (distance(last, shared) <= reach) return last;
  if (distance(first, shared) <= reach) return first;
  if (onSegment(last, first, shared)) return last;
  return onSegment(first, shared, last) ? first : null;
}
