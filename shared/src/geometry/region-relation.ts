import { bounds, boundsOverlap } from './bounds.ts';
import { orientation } from './orientation.ts';
import type { Point, Region, Ring } from './point.ts';
import { pointInRegion } from './point-in-region.ts';
import { ringEdges } from './ring-edges.ts';
import { segmentsCross } from './segments-cross.ts';
import { signedArea } from './signed-area.ts';

/**
 * How two regions lie: `apart` (they may share walls), the first `inside` the second, the first `around` the second, or
 * `overlap` in any other way, the same region twice included.
 */
export type RegionRelation = 'apart' | 'inside' | 'around' | 'overlap';

/** An edge with its region on the left. */
type Edge = readonly [Point, Point];

/**
 * Compares two regions of one plan. Corners must be shared or settled: where a corner of one lies on an edge of the
 * other, that edge ends there as well. Each edge is then wholly inside, wholly outside or an edge of the other, so its
 * midpoint and its side decide, and no boolean operation on polygons is needed.
 */
export function regionRelation(a: Region, b: Region): RegionRelation {
  if (!boundsOverlap(bounds(a.ring), bounds(b.ring))) return 'apart';
  const edgesA = edgesOf(a);
  const edgesB = edgesOf(b);
  for (const [p, q] of edgesA) {
    for (const [r, s] of edgesB) if (segmentsCross(p, q, r, s)) return 'overlap';
  }
  const ofA = whereEdgesLie(edgesA, b, edgesB);
  const ofB = whereEdgesLie(edgesB, a, edgesA);
  if (!ofA.inside && !ofB.inside && !ofA.sameSide) return 'apart';
  if (ofA.oppositeSide) return 'overlap';
  if (!ofA.outside && !ofB.inside && ofB.outside) return 'inside';
  if (!ofB.outside && !ofA.inside && ofA.outside) return 'around';
  return 'overlap';
}

function edgesOf(region: Region): Edge[] {
  return [...ringEdges(turned(region.ring, 1)), ...region.holes.flatMap((hole) => ringEdges(turned(hole, -1)))];
}

function turned(ring: Ring, sign: 1 | -1): Ring {
  return signedArea(ring) * sign < 0 ? [...ring].reverse() : ring;
}

interface WhereEdgesLie {
  inside: boolean;
  outside: boolean;
  sameSide: boolean;
  oppositeSide: boolean;
}

function whereEdgesLie(edges: readonly Edge[], other: Region, otherEdges: readonly Edge[]): WhereEdgesLie {
  const found: WhereEdgesLie = { inside: false, outside: false, sameSide: false, oppositeSide: false };
  for (const [a, b] of edges) {
    const shared = otherEdges.find(([c, d]) => (same(a, c) && same(b, d)) || (same(a, d) && same(b, c)));
    if (shared !== undefined) {
      if (same(a, shared[0])) found.sameSide = true;
      else found.oppositeSide = true;
      continue;
    }
    const middle = { x_m: (a.x_m + b.x_m) / 2, y_m: (a.y_m + b.y_m) / 2 };
    const where = pointInRegion(middle, other);
    if (where === 'inside') found.inside = true;
    else if (where === 'outside') found.outside = true;
    else if (liesBeside(a, b, otherEdges)) found.outside = true;
  }
  return found;
}

function same(a: Point, b: Point): boolean {
  return a === b || (a.x_m === b.x_m && a.y_m === b.y_m);
}

/** A midpoint within tolerance of an edge it does not belong to: a sliver; its ends tell whether it lies along it. */
function liesBeside(a: Point, b: Point, edges: readonly Edge[]): boolean {
  return !edges.some(([c, d]) => orientation(c, d, a) === 0 && orientation(c, d, b) === 0);
}
