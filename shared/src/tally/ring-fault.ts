import { selfCrossing } from '../geometry/self-crossing.ts';
import { signedArea } from '../geometry/signed-area.ts';
import { pointsOf, type Pairs } from './points-of.ts';

const LEAST_AREA_M2 = 0.01;

/** Why a ring cannot bound a room or a hole: edges that cross or touch, or no area. Undefined when it can. */
export function ringFault(pairs: Pairs): { code: string; message: string } | undefined {
  const ring = pointsOf(pairs);
  const crossing = selfCrossing(ring);
  if (crossing) {
    const [a, b] = crossing.edges;
    return {
      code: 'self_crossing',
      message: `Edges ${a + 1} and ${b + 1} of the ring cross or touch. Each edge may meet its two neighbours only.`,
    };
  }
  if (Math.abs(signedArea(ring)) < LEAST_AREA_M2) {
    return {
      code: 'no_area',
      message: 'The ring encloses less than 0.01 m². Give the corners in order around the room.',
    };
  }
  return undefined;
}
