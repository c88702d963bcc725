import type { Point, Region } from './point.ts';
import { pointInRing, type Whereabouts } from './point-in-ring.ts';

/** Where a place lies against a ring with holes; the edge of a hole counts as `on`, inside a hole is `outside`. */
export function pointInRegion(point: Point, region: Region): Whereabouts {
  const outer = pointInRing(point, region.ring);
  if (outer !== 'inside') return outer;
  for (const hole of region.holes) {
    const inner = pointInRing(point, hole);
    if (inner === 'on') return 'on';
    if (inner === 'inside') return 'outside';
  }
  return 'inside';
}
