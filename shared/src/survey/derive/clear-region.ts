import { holesFit } from '../../geometry/holes-fit.ts';
import { insetRing } from '../../geometry/inset-ring.ts';
import type { Region, Ring } from '../../geometry/point.ts';

/**
 * What is left of a room on centre lines when half the wall thickness is taken off every wall, holes included.
 *
 * @param half_m half the wall thickness, 0 to 1 m
 * @returns null where the walls leave no floor, part the room in two, or grow into one another
 */
export function clearRegion(region: Region, half_m: number): Region | null {
  const ring = insetRing(region.ring, half_m);
  if (ring === null) return null;
  const holes: Ring[] = [];
  for (const hole of region.holes) {
    const grown = insetRing(hole, -half_m);
    if (grown === null) return null;
    holes.push(grown);
  }
  const clear = { ring, holes };
  return half_m === 0 || holesFit(clear) ? clear : null;
}
