export interface BandScale {
  readonly from: number;
  readonly to: number;
  /** Share of the width, 0 to 1. */
  readonly at: (value: number) => number;
}

/**
 * The stretch of the number line a band bar shows: the band and every limit near it, with air on both sides. It starts
 * at 0 when the band itself comes near 0. A limit more than three times the band's top away is left off the line.
 */
export function bandScale(band: readonly [low: number, high: number], bounds: readonly number[]): BandScale {
  const [low, high] = band;
  const shown = bounds.filter((bound) => bound <= 3 * high);
  const first = Math.min(low, ...shown);
  const last = Math.max(high, ...shown);
  const air = Math.max((last - first) * 0.45, last * 0.04, 1e-9);
  const from = first - air < last * 0.15 ? 0 : first - air;
  const to = last + air;
  return { from, to, at: (value) => (value - from) / (to - from) };
}
