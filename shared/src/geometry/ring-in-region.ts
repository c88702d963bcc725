import type { Region, Ring } from './point.ts';
import { pointInRegion } from './point-in-region.ts';
import { pointInRing } from './point-in-ring.ts';
import { ringEdges } from './ring-edges.ts';
import { segmentsCross } from './segments-cross.ts';

/**
 * Whether a ring, such as a rotated footprint, lies wholly in a region; touching the region's edge is within. Edges are
 * compared with the plan's tolerance, so a footprint flush with a slanted wall counts as inside.
 */
export function ringInRegion(inner: Ring, region: Region): boolean {
  if (inner.some((point) => pointInRegion(point, region) === 'outside')) return false;
  const loops = [region.ring, ...region.holes];
  for (const loop of loops) {
    // A corner of the region inside the footprint, or a wall through it, leaves part of the footprint outside.
    if (loop.some((corner) => pointInRing(corner, inner) === 'inside')) return false;
    for (const [a, b] of ringEdges(loop)) {
      for (const [c, d] of ringEdges(inner)) {
        if (segmentsCross(a, b, c, d) && [c, d].every((end) => pointInRing(end, loop) !== 'on')) return false;
      }
    }
  }
  return true;
}
