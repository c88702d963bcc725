import { portableLog, portableLog1p } from './portable-functions.ts';

/** Mean and standard deviation of ln x of a lognormal distribution from the mean and coefficient of variation of x. */
export function lognormalParameters(mean: number, V: number): { mu: number; sigma: number } {
  // Neither a tiny V may vanish beside 1 nor the square of a huge one overflow.
  const variance = V < 1e8 ? portableLog1p(V * V) : 2 * portableLog(V);
  return { mu: portableLog(mean) - variance / 2, sigma: Math.sqrt(variance) };
}
