import type { Region } from '../../geometry/point.ts';
import { insetRing } from '../../geometry/inset-ring.ts';
import { ringEdges } from '../../geometry/ring-edges.ts';
import { ringInRegion } from '../../geometry/ring-in-region.ts';
import { segmentsCross } from '../../geometry/segments-cross.ts';

/**
 * What is left of a room on centre lines when half the wall thickness is taken off every wall, holes included.
 *
 * @param half_m half the wall thickness, 0 to 1 m
 * @returns null where the walls leave no floor, part the room in two, or grow into one another
 */
export function clearRegion(region: Region, half_m: number): Region | null {
  const ring = insetRing(region.ring, half_m);
  if (ring === null) return null;
  const holes: Region['holes'][number][] = [];
  for (const hole of region.holes) {
    const grown = insetRing(hole, -half_m);
    if (grown === null || !ringInRegion(grown, { ring, holes })) return null;
    const crosses = [ring, ...holes].some((loop) =>
      ringEdges(loop).some(([a, b]) => ringEdges(grown).some(([c, d]) => segmentsCross(a, b, c, d))),
    );
    if (crosses) return null;
    holes.push(grown);
  }
  return { ring, holes };
}
