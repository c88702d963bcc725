import type { LiningLayer } from '../catalogue/catalogue-row.ts';

/** A lined surface of the room without its openings; layers exposed side first. */
export interface LinedSurface {
  /** m² */
  readonly area_m2: number;
  readonly layers: readonly Omit<LiningLayer, 'label'>[];
}

/** What the spread of fire needs to know of the room. */
export interface SpreadRoom {
  /** Null: a lining is not known, so the hot layer is left out. */
  readonly surfaces: readonly LinedSurface[] | null;
  /** A_T, enclosing area less what is open, m². */
  readonly liningArea_m2: number;
  /** A√H before flashover, m^5/2; 0: closed. */
  readonly factorBefore: number;
  /** A√H after flashover, broken glass counted, m^5/2. */
  readonly factorAfter: number;
  /** Lowest criterion that applies, kW; null: none applies, so there is no flashover. */
  readonly flashover_kW: number | null;
  readonly ambient_C: number;
  /** Above 500 m² or 6 m one hot layer is no description of the room; it is left out. */
  readonly large: boolean;
  /** Heat until the air of a closed room is used up, MJ; null: not known. Counts while there is no opening. */
  readonly oxygenLimitedHeat_MJ: number | null;
}
