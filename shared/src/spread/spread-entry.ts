import type { Footprint } from '../geometry/footprint.ts';
import type { Ignition } from './ignition-class.ts';

/** Where an entry stands: its footprint on the plan, the height of its base above the floor and its own height, m. */
export interface Place extends Footprint {
  readonly base_m: number;
  readonly height_m: number;
}

/** How an entry burns once it is lit, before openings hold it back. */
export type Growth =
  | { readonly by: 't-squared'; readonly alpha_kW_s2: number }
  /** At its peak from the start until it is used up: liquids and gases. */
  | { readonly by: 'step' }
  /** Measured; times are stretched so that the curve holds the entry's heat. */
  | { readonly by: 'measured'; readonly points: readonly (readonly [number, number])[] };

/** One entry as the spread of fire knows it. */
export interface SpreadEntry {
  readonly id: string;
  /** Null: not on the plan. It neither gives nor takes radiation, but the hot layer and flashover reach it. */
  readonly place: Place | null;
  /** Heat it can give off, combustion and enclosure factors in it, MJ. */
  readonly heat_MJ: number;
  /** kW */
  readonly peak_kW: number;
  readonly growth: Growth;
  /** Share of its heat that leaves as radiation, 0 to 1. */
  readonly radiativeFraction: number;
  readonly ignition: Ignition;
  /** `cabinet`: lit by flashover only. `sealed`: never lit, its heat does not count. */
  readonly enclosure: 'open' | 'cabinet' | 'sealed';
}
