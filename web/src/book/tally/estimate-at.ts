import type { Estimate } from '@embertally/shared/methods/estimate';
import type { RoomTally } from '@embertally/shared/tally/room-tally';

const isRecord = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null;

const isEstimate = (value: Record<string, unknown>): value is Record<string, unknown> & Estimate =>
  typeof value['method'] === 'string' && typeof value['unit'] === 'string' && Array.isArray(value['warnings']);

/**
 * The number at a path of the tally, as `load.perFloor` or `load.byEntry.3.heat`.
 *
 * @returns null when nothing was computed there
 */
export function estimateAt(tally: RoomTally, path: string): Estimate | null {
  let here: unknown = tally;
  for (const step of path.split('.')) {
    if (!isRecord(here)) return null;
    here = here[step];
  }
  return isRecord(here) && isEstimate(here) ? here : null;
}
