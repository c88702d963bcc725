import type { Estimate } from '../methods/estimate.ts';

/** How sure the numbers of a room are, from samples of everything that is not exactly known. */
export interface RoomUncertainty {
  readonly samples: number;
  /** The same seed gives the same numbers on every machine. */
  readonly seed: number;
  readonly bands: {
    /** Of `load.total`, MJ. */
    readonly total: UncertaintyBand;
    /** Of `load.perFloor`, MJ/m²; the same numbers stand in `load.band`. */
    readonly perFloor?: UncertaintyBand;
    /** Of `growth.peak`, kW. */
    readonly peak?: UncertaintyBand;
    /** Of `burnout.asKept.equivalentTime`, min. */
    readonly equivalentTime?: UncertaintyBand;
  };
  /** What the variance of the density comes from, largest first; shares below 0.1 % are one row, `rest`. */
  readonly shares: readonly UncertaintyShare[];
  /** What would make the density surer, most effective first; empty where nothing would by much. */
  readonly advice: readonly UncertaintyAdvice[];
}

export interface UncertaintyBand {
  readonly p5: Estimate;
  readonly p50: Estimate;
  readonly p80: Estimate;
  readonly p95: Estimate;
  readonly mean: Estimate;
}

/** One input and how much of the variance comes from it alone. */
export interface UncertaintyShare {
  /** `mass:<entry id>`, `enclosure:<entry id>`, `heat:<material>`, `overlooked`, `floor` or `rest`. */
  readonly key: string;
  readonly label: string;
  readonly kind: 'mass' | 'enclosure' | 'heat' | 'room';
  /** Entries the input belongs to; empty for what belongs to the room. */
  readonly entryIds: readonly string[];
  /** Percent of the variance. */
  readonly share: Estimate;
}

export interface UncertaintyAdvice {
  readonly kind: 'weigh' | 'heat';
  /** What to do and what it would bring, as one sentence. */
  readonly text: string;
  readonly entryIds: readonly string[];
  /** How much narrower the band from p5 to p95 would be, as a share of its present width. */
  readonly narrowing: number;
  /** MJ/m², first order, after the advice was followed. */
  readonly p5: Estimate;
  readonly p95: Estimate;
}
