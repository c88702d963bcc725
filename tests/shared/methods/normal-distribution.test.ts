import { describe, expect, it } from 'vitest';
import { normalCdf, normalQuantile } from '@embertally/shared/methods/statistics/normal-distribution';

describe('the standard normal quantile', () => {
  // Printed with the algorithm: M. J. Wichura, AS 241, Applied Statistics 37 (1988), table of test values.
  it.each([
    [0.25, -0.6744897501960817],
    [0.001, -3.090232306167814],
    [1e-20, -9.26234008979841],
  ])('of %f is %f', (p, z) => {
    expect(Math.abs(normalQuantile(p) / z - 1)).toBeLessThan(1e-14);
  });
  it('is the way back from the distribution function, on both sides', () => {
    for (let z = -5; z <= 5; z += 0.01) expect(Math.abs(normalQuantile(normalCdf(z)) - z)).toBeLessThan(2e-10);
  });
  it('is odd about one half, and infinite only at the ends', () => {
    for (const p of [0.5, 0.3, 0.075, 0.0749, 1e-6]) expect(normalQuantile(1 - p)).toBeCloseTo(-normalQuantile(p), 9);
    expect(normalQuantile(0)).toBe(-Infinity);
    expect(normalQuantile(1)).toBe(Infinity);
    expect(Number.isFinite(normalQuantile(2 ** -33))).toBe(true);
  });
});
