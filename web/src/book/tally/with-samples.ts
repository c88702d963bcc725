import type { RoomTally } from '@embertally/shared/tally/room-tally';
import type { CalculationValue } from '../session/calculation-message.ts';

/** The tally with its first-order band replaced by the sampled one, once that is here. */
export function withSamples(tally: RoomTally, value: CalculationValue['uncertainty'] | null): RoomTally {
  if (value?.uncertainty === undefined || value.band === undefined) return tally;
  return { ...tally, load: { ...tally.load, band: value.band }, uncertainty: value.uncertainty };
}
