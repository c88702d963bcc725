/** What a person may say for the further readings; everything else comes from the room. */
export interface FurtherAsked {
  /** From the façade to the building, the plot or the goods opposite, m. */
  readonly opposite_m: number;
  /** From the middle of a fire to who or what stands aside, m. */
  readonly aside_m: number;
  /** Time at which nominal curves and charring are read, min. */
  readonly minutes: number;
}

/** With these the readings are made until somebody says otherwise. */
export const USUAL_FURTHER: FurtherAsked = { opposite_m: 4, aside_m: 3, minutes: 30 };

/** What may be said: metres and minutes, ends included. */
export const FURTHER_RANGES = {
  opposite_m: { least: 0.5, most: 200 },
  aside_m: { least: 0.5, most: 200 },
  minutes: { least: 1, most: 360 },
} as const satisfies Record<keyof FurtherAsked, { least: number; most: number }>;

/** A value said by nobody is a default of the working. */
export function askedOrigin(asked: FurtherAsked, key: keyof FurtherAsked): 'given' | 'default' {
  return asked[key] === USUAL_FURTHER[key] ? 'default' : 'given';
}
