import { OutOfRangeError } from '../estimate.ts';

const LEAST_M = 1e-3;

/** Height above the virtual origin, m. @throws OutOfRangeError at or below it, where plume relations do not hold. */
export function aboveOrigin(z: number, z_0: number): number {
  if (!(z - z_0 > LEAST_M))
    throw new OutOfRangeError(
      'The height asked for is not above the virtual origin of the plume: it lies in the flame.',
    );
  return z - z_0;
}
