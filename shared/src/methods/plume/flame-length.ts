/**
 * Height of the flame above its base, m, after Heskestad 1983 (from memory): L = 0.235 Q^0.4 − 1.02 D, at least 0.
 * @param rate heat release rate, kW, 0 and up
 * @param diameter of the circle with the footprint's area, m
 */
export function flameLength(rate: number, diameter: number): number {
  return Math.max(0, 0.235 * rate ** 0.4 - 1.02 * diameter);
}

/** Heat release rate at which the flame is `length` m high, kW. */
export function rateForFlame(length: number, diameter: number): number {
  return ((length + 1.02 * diameter) / 0.235) ** 2.5;
}
