export type Standing = 'within' | 'near' | 'over' | 'no limit set';

const NEAR_FROM = 0.9;

/**
 * How a value stands against a bound: over when value / bound > 1, near from 0.9 to 1 with both ends, else within.
 * Judged on the unrounded value, so 1.0001 of a bound is over however it prints. No value or no bound: no limit set.
 */
export function standingOf(value: number | null | undefined, bound: number | null | undefined): Standing {
  if (value == null || bound == null || !(bound > 0)) return 'no limit set';
  const ratio = value / bound;
  if (ratio > 1) return 'over';
  return ratio >= NEAR_FROM ? 'near' : 'within';
}
