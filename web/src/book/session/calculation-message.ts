import type { RoomInput } from '@embertally/shared/tally/room-input';
import type { RoomTally } from '@embertally/shared/tally/room-tally';

/** What a calculation in the background is asked for; everything comes with workings. */
export type CalculationTask =
  /** How sure the room is, from `input.options.samples` samples. */
  | { readonly kind: 'uncertainty'; readonly input: RoomInput }
  /** Which entry ignites which, beginning with `input.options.first_entry` or the worst one. */
  | { readonly kind: 'spread'; readonly input: RoomInput };

/** What each kind of task gives. */
export interface CalculationValue {
  /** Absent numbers are named in `missing`. */
  readonly uncertainty: Pick<RoomTally, 'uncertainty' | 'missing'> & { readonly band: RoomTally['load']['band'] };
  readonly spread: { readonly spread: RoomTally['spread']; readonly missing: RoomTally['missing'] };
}

export type CalculationKind = CalculationTask['kind'];

/** What the thread says while it calculates and at its end. */
export type CalculationMessage =
  | { readonly kind: 'progress'; readonly fraction: number }
  | { readonly kind: 'done'; readonly value: CalculationValue[CalculationKind] }
  | { readonly kind: 'failed'; readonly message: string };
