import type { Composition } from './composition.ts';

/** What a heat should be by something else that is known of the material, dry, MJ/kg. */
export interface Expectation {
  readonly name: string;
  readonly net: number;
  readonly gross: number | null;
}

/** What one way yields, before its basis is checked and water is counted. */
export interface WayHeat {
  /** Whether the heats are of the dry material, or of the material as it lies there. */
  readonly state: 'dry' | 'received';
  /** Which of the two was measured or stated; the other follows from the heat in the water. */
  readonly measured: 'net' | 'gross';
  readonly net_MJ_kg: number;
  readonly gross_MJ_kg: number | null;
  readonly low_MJ_kg: number;
  readonly high_MJ_kg: number;
  readonly range_basis: string;
  /** Water as it lies there, kg per wet kg; null where nothing is said. */
  readonly water: number | null;
  readonly composition: Composition | null;
  /** What the heat rests on, in words: `3 bomb runs`. */
  readonly rests_on: string;
  /** Where the main figure stands in the draft. */
  readonly pointer: string;
  /** What to look at when the heat is twice or half of what it could be. */
  readonly suspects: string;
  readonly expectation?: Expectation;
  /** The parts' own, where a mixture says more than a default. */
  readonly cellulosic?: boolean;
  readonly radiative_fraction?: number;
}
