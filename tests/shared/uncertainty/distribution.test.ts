import { jStat } from 'jstat';
import { describe, expect, it } from 'vitest';
import { type Distribution, momentsOf, quantileOf } from '@embertally/shared/uncertainty/distribution';
import { fillSamples } from '@embertally/shared/uncertainty/fill-samples';

const KINDS: readonly Distribution[] = [
  { kind: 'normal', mean: 17.5, deviation: 1 },
  { kind: 'lognormal', mean: 420, deviation: 126 },
  { kind: 'triangular', low: 10, mode: 15, high: 25 },
  { kind: 'triangular', low: 0, mode: 0.05, high: 0.15 },
  { kind: 'triangular', low: 3, mode: 3, high: 4 },
  { kind: 'triangular', low: 3, mode: 4, high: 4 },
  { kind: 'pert', low: 10, mode: 15, high: 25 },
  { kind: 'pert', low: 0, mode: 0, high: 1 },
];
const PLACES = [0.001, 0.05, 0.25, 0.5, 0.8, 0.95, 0.999];

function filled(distribution: Distribution, uniform: readonly number[]): number[] {
  const out = Float64Array.from(uniform);
  fillSamples(distribution)(out, out, out.length);
  return [...out];
}

describe('a distribution', () => {
  it.each(PLACES)('agrees with jStat at %d', (p) => {
    expect(quantileOf({ kind: 'normal', mean: 17.5, deviation: 1 }, p)).toBeCloseTo(jStat.normal.inv(p, 17.5, 1), 6);
    const sigma = Math.sqrt(Math.log(1.09));
    const lognormal = jStat.lognormal.inv(p, Math.log(420) - sigma ** 2 / 2, sigma);
    expect(quantileOf({ kind: 'lognormal', mean: 420, deviation: 126 }, p) / lognormal).toBeCloseTo(1, 6);
    const triangular = jStat.triangular.inv(p, 10, 25, 15);
    expect(quantileOf({ kind: 'triangular', low: 10, mode: 15, high: 25 }, p)).toBeCloseTo(triangular, 9);
    const beta = 10 + 15 * jStat.beta.inv(p, 1 + 4 / 3, 1 + 8 / 3);
    expect(quantileOf({ kind: 'pert', low: 10, mode: 15, high: 25 }, p)).toBeCloseTo(beta, 5);
  });

  it('has the mean and deviation of the textbooks', () => {
    const triangular = momentsOf({ kind: 'triangular', low: 10, mode: 15, high: 25 });
    expect(triangular.mean).toBeCloseTo(16.66667, 5);
    expect(triangular.deviation).toBeCloseTo(3.11805, 5);
    const pert = momentsOf({ kind: 'pert', low: 10, mode: 15, high: 25 });
    expect(pert.mean).toBeCloseTo(15.83333, 5);
    expect(pert.deviation).toBeCloseTo(2.76385, 5);
  });

  it.each(KINDS)('as samples, $kind is the inverse, and its moments are those of the integral', (distribution) => {
    const { mean, deviation } = momentsOf(distribution);
    const near = distribution.kind === 'pert' ? 0.002 * (distribution.high - distribution.low) : 1e-9 * mean;
    filled(distribution, PLACES).forEach((value, i) => {
      expect(Math.abs(value - quantileOf(distribution, PLACES[i]!))).toBeLessThanOrEqual(near);
    });
    const N = 200_000;
    const even = filled(
      distribution,
      Array.from({ length: N }, (_, i) => (i + 0.5) / N),
    );
    const m = even.reduce((sum, x) => sum + x, 0) / N;
    const s = Math.sqrt(even.reduce((sum, x) => sum + (x - m) ** 2, 0) / N);
    expect(m / mean).toBeCloseTo(1, 3);
    expect(s / deviation).toBeCloseTo(1, 2);
  });

  it('of one point is that point', () => {
    for (const kind of ['triangular', 'pert'] as const) {
      const distribution = { kind, low: 17, mode: 17, high: 17 };
      expect(filled(distribution, PLACES)).toEqual(PLACES.map(() => 17));
      expect(momentsOf(distribution)).toMatchObject({ mean: 17, deviation: 0 });
    }
  });

  it.each([
    { kind: 'triangular', low: 2, mode: 1, high: 3 },
    { kind: 'pert', low: 1, mode: 4, high: 3 },
    { kind: 'lognormal', mean: 0, deviation: 1 },
  ] as const)('that is none is refused: $kind', (distribution) => {
    expect(() => fillSamples(distribution)).toThrow(/order|above 0/);
    expect(() => quantileOf(distribution, 0.5)).toThrow(/order|above 0/);
  });
});
