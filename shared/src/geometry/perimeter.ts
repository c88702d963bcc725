import { distance } from './distance.ts';
import type { Ring } from './point.ts';
import { ringEdges } from './ring-edges.ts';

/** Length all the way round a ring, m. */
export function perimeter(ring: Ring): number {
  let sum = 0;
  for (const [a, b] of ringEdges(ring)) sum += distance(a, b);
  return sum;
}
