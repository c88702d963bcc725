/** Mean and standard deviation of ln x of a lognormal distribution from the mean and coefficient of variation of x. */
export function lognormalParameters(mean: number, V: number): { mu: number; sigma: number } {
  const variance = Math.log(1 + V * V);
  return { mu: Math.log(mean) - variance / 2, sigma: Math.sqrt(variance) };
}
