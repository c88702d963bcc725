import type { Curve } from './curve.ts';

export interface CurveTotals {
  /** MJ, or MJ/m² for a rate per area. */
  readonly heat_MJ: number;
  readonly peak: number;
  readonly peak_s: number;
  readonly duration_s: number;
}

/** Area, peak and time of the peak; 0 for an empty curve. */
export function curveTotals({ time_s, rate }: Curve): CurveTotals {
  let kilojoules = 0;
  let top = 0;
  for (let i = 1; i < rate.length; i += 1) {
    kilojoules += ((rate[i]! + rate[i - 1]!) / 2) * (time_s[i]! - time_s[i - 1]!);
    if (rate[i]! > rate[top]!) top = i;
  }
  return {
    heat_MJ: kilojoules / 1000,
    peak: rate[top] ?? 0,
    peak_s: time_s[top] ?? 0,
    duration_s: (time_s.at(-1) ?? 0) - (time_s[0] ?? 0),
  };
}
