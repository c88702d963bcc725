import { OutOfRangeError } from '../methods/estimate.ts';
import { lognormalParameters } from '../methods/statistics/lognormal-parameters.ts';
import { normalQuantile } from '../methods/statistics/normal-distribution.ts';
import { portableExp } from '../methods/statistics/portable-functions.ts';
import { pertFractile } from '../methods/statistics/pert-fractile.ts';
import { triangularFractile } from '../methods/statistics/triangular-fractile.ts';

/**
 * How a value that is not exactly known is spread. Means and deviations are those of the value itself, also where the
 * logarithm is what is normal; a triangular or PERT distribution of one point is that point.
 */
export type Distribution =
  | { readonly kind: 'normal'; readonly mean: number; readonly deviation: number }
  /** Mean above 0. */
  | { readonly kind: 'lognormal'; readonly mean: number; readonly deviation: number }
  | { readonly kind: 'triangular'; readonly low: number; readonly mode: number; readonly high: number }
  /** A beta distribution that leans on the mode four times as much as on either end. */
  | { readonly kind: 'pert'; readonly low: number; readonly mode: number; readonly high: number };

export interface Moments {
  readonly mean: number;
  readonly deviation: number;
}

/** Mean and standard deviation, exact. @throws OutOfRangeError when low, mode and high are not in order */
export function momentsOf(distribution: Distribution): Moments {
  switch (distribution.kind) {
    case 'normal':
    case 'lognormal':
      return { mean: distribution.mean, deviation: distribution.deviation };
    case 'triangular':
      return triangularFractile.run(threePoints(distribution, 0.5));
    case 'pert':
      return pertFractile.run(threePoints(distribution, 0.5));
  }
}

/**
 * The value that is not exceeded with probability p, 0 < p < 1.
 * @throws OutOfRangeError when the numbers do not make a distribution
 */
export function quantileOf(distribution: Distribution, p: number): number {
  switch (distribution.kind) {
    case 'normal':
      return distribution.mean + distribution.deviation * normalQuantile(p);
    case 'lognormal': {
      const { mean, deviation } = distribution;
      if (!(mean > 0)) throw new OutOfRangeError('A lognormal distribution has a mean above 0.');
      const { mu, sigma } = lognormalParameters(mean, deviation / mean);
      return portableExp(mu + sigma * normalQuantile(p));
    }
    case 'triangular':
      return triangularFractile.run(threePoints(distribution, p)).fractile;
    case 'pert':
      return pertFractile.run(threePoints(distribution, p)).fractile;
  }
}

function threePoints({ low, mode, high }: { low: number; mode: number; high: number }, p: number) {
  return { a: low, m: mode, b: high, p };
}
