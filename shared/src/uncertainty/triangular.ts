/** Mean of a triangular distribution. */
export function triangularMean(low: number, mode: number, high: number): number {
  return (low + mode + high) / 3;
}

/** Standard deviation of a triangular distribution; 0 when low, mode and high are one. */
export function triangularDeviation(low: number, mode: number, high: number): number {
  const variance = (low * low + high * high + mode * mode - low * high - low * mode - high * mode) / 18;
  return Math.sqrt(Math.max(0, variance));
}
