import { airSection } from './air-section.ts';
import { roomBasis } from './room-basis.ts';
import type { RoomInput } from './room-input.ts';
import type { Missing, SpreadTally } from './room-tally.ts';
import { spreadSection } from './spread-section.ts';

export interface SpreadEstimate {
  readonly spread: SpreadTally;
  /** What of it could not be computed, and which input is lacking. */
  readonly missing: readonly Missing[];
}

/**
 * The section `spread` of a tally on its own, for a thread that has time: the same numbers as `estimateRoom` gives.
 * @param options `workings: true` adds inputs, steps and sources to every estimate
 */
export function estimateSpread(input: RoomInput, options: { readonly workings?: boolean } = {}): SpreadEstimate {
  const silent = { workings: false, missing: [] };
  const basis = roomBasis(input, silent);
  const air = airSection(basis, silent);
  const missing: Missing[] = [];
  const spread = spreadSection(basis, air, { workings: options.workings ?? false, missing });
  return { spread, missing };
}
