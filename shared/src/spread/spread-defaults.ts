/** What was assumed of entries that did not say, in the words a working prints. */
export const SPREAD_DEFAULTS = {
  PEAK_FROM_KIND: 'No peak is given: the rate per area usual for the kind × the footprint.',
  PEAK_FROM_FOOTPRINT: 'No peak is given: 500 kW/m2 × the footprint (common practice).',
  PEAK_FROM_POOL:
    'Mostly liquid and no peak is given: a pool as large as its footprint (Babrauskas, from memory). What runs out burns over more.',
  PEAK_FROM_HEAT:
    'Neither peak nor footprint is given: the heat over 1200 s of free burning (Law & O’Brien, from memory).',
  CURVE_STRETCHED: 'The measured curve holds other heat than the entry: its rates are kept, its times stretched.',
  CURVE_NOT_USED: 'The measured curve holds no heat, or heat of another order than the entry: it is left aside.',
  GROWTH_FROM_KIND: 'No growth class is given: the one usual for the kind.',
  GROWTH_FROM_ROOM: 'No growth class is given: the one of the room.',
  GROWTH_AT_ONCE: 'Mostly liquid or gas and no growth class is given: it burns at its peak from the start.',
  IGNITION_FROM_KIND: 'No ignition class is given: the one usual for the kind.',
  IGNITION_FROM_MATERIAL: 'No ignition class is given: the one of the material with most of the heat.',
  IGNITION_NORMAL: 'No ignition class is given: normal.',
  RADIATIVE_FRACTION_FROM_KIND: 'No radiative fraction is given: the one usual for the kind.',
  RADIATIVE_FRACTION_USUAL: 'No radiative fraction is given: 0.35.',
  NOT_ON_PLAN: 'Not on the plan: neither gives nor takes radiation; the hot layer and flashover reach it.',
  FOOTPRINT_FROM_PEAK: 'No footprint is given: the square that gives its peak at 500 kW/m2.',
  HEIGHT_USUAL: 'No height is given: 1 m.',
  SEAL_NOT_RATED: 'Sealed without a rating: taken as open.',
} as const;

export type SpreadDefaultCode = keyof typeof SPREAD_DEFAULTS;

/** A default with the entries it was used for. */
export interface SpreadDefault {
  readonly code: SpreadDefaultCode;
  readonly text: string;
  readonly entryIds: readonly string[];
}
