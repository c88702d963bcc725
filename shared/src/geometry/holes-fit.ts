import { pointInRing } from './point-in-ring.ts';
import type { Region, Ring } from './point.ts';
import { ringEdges } from './ring-edges.ts';
import { segmentsCross } from './segments-cross.ts';

/** Whether every hole of a region lies inside its ring and outside the other holes, crossing and touching none. */
export function holesFit(region: Region): boolean {
  return region.holes.every((hole, index) => {
    const others = region.holes.slice(index + 1);
    if (hole.some((corner) => pointInRing(corner, region.ring) !== 'inside')) return false;
    if (cross(hole, region.ring)) return false;
    return others.every((other) => {
      const apart = (a: Ring, b: Ring) => a.every((corner) => pointInRing(corner, b) === 'outside');
      return apart(hole, other) && apart(other, hole) && !cross(hole, other);
    });
  });
}

function cross(a: Ring, b: Ring): boolean {
  return ringEdges(a).some(([p, q]) => ringEdges(b).some(([r, s]) => segmentsCross(p, q, r, s)));
}
