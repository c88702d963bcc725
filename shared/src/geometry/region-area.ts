import type { Region } from './point.ts';
import { signedArea } from './signed-area.ts';

/** Area of a ring less its holes, m². The holes are taken to lie inside the ring and apart from one another. */
export function regionArea(region: Region): number {
  return region.holes.reduce((area, hole) => area - Math.abs(signedArea(hole)), Math.abs(signedArea(region.ring)));
}
