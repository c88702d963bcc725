import { OutOfRangeError } from '../methods/estimate.ts';
import { lognormalParameters } from '../methods/statistics/lognormal-parameters.ts';
import { normalQuantile } from '../methods/statistics/normal-distribution.ts';
import { portableExp } from '../methods/statistics/portable-functions.ts';
import type { Distribution } from './distribution.ts';
import { pertTable } from './pert-table.ts';

/** Turns uniform numbers into samples of one distribution; `out` may be `uniform` itself. */
export type FillSamples = (uniform: Float64Array, out: Float64Array, count: number) => void;

/**
 * The inverse of a distribution as a loop over many uniform numbers at once, with everything that does not change taken
 * out of the loop. The same uniform number gives the same place in every distribution, which is how parts that share an
 * input move together.
 * @throws OutOfRangeError when the numbers do not make a distribution
 */
export function fillSamples(distribution: Distribution): FillSamples {
  switch (distribution.kind) {
    case 'normal':
      return normalSamples(distribution.mean, distribution.deviation);
    case 'lognormal':
      return lognormalSamples(distribution.mean, distribution.deviation);
    case 'triangular':
      return triangularSamples(distribution.low, distribution.mode, distribution.high);
    case 'pert':
      return pertSamples(distribution.low, distribution.mode, distribution.high);
  }
}

function normalSamples(mean: number, deviation: number): FillSamples {
  return (uniform, out, count) => {
    for (let i = 0; i < count; i += 1) out[i] = mean + deviation * normalQuantile(uniform[i]!);
  };
}

function lognormalSamples(mean: number, deviation: number): FillSamples {
  if (!(mean > 0)) throw new OutOfRangeError('A lognormal distribution has a mean above 0.');
  const { mu, sigma } = lognormalParameters(mean, deviation / mean);
  return (uniform, out, count) => {
    for (let i = 0; i < count; i += 1) out[i] = portableExp(mu + sigma * normalQuantile(uniform[i]!));
  };
}

function triangularSamples(low: number, mode: number, high: number): FillSamples {
  if (!(low <= mode && mode <= high)) throw new OutOfRangeError('Lowest, likeliest and highest are not in order.');
  const width = high - low;
  const corner = width > 0 ? (mode - low) / width : 0;
  const rising = width * (mode - low);
  const falling = width * (high - mode);
  return (uniform, out, count) => {
    for (let i = 0; i < count; i += 1) {
      const u = uniform[i]!;
      out[i] = u < corner ? low + Math.sqrt(u * rising) : high - Math.sqrt((1 - u) * falling);
    }
  };
}

function pertSamples(low: number, mode: number, high: number): FillSamples {
  if (!(low <= mode && mode <= high)) throw new OutOfRangeError('Lowest, likeliest and highest are not in order.');
  const width = high - low;
  if (width === 0) return (_uniform, out, count) => void out.fill(low, 0, count);
  const inverse = pertTable((mode - low) / width);
  return (uniform, out, count) => {
    for (let i = 0; i < count; i += 1) out[i] = low + width * inverse(uniform[i]!);
  };
}
