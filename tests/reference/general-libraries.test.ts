import gumbelQuantile from '@stdlib/stats-base-dists-gumbel-quantile';
import { jStat } from 'jstat';
import { unit } from 'mathjs';
import { MF } from 'mf-parser';
import { describe, expect, it } from 'vitest';
import { WATER_PER_HYDROGEN } from '@embertally/shared/methods/heat/water';
import { perFloor } from '@embertally/shared/methods/load/per-floor';
import { gumbelFractile } from '@embertally/shared/methods/statistics/gumbel-fractile';
import { gumbelPlace } from '@embertally/shared/methods/statistics/gumbel-place';
import { lognormalFractile } from '@embertally/shared/methods/statistics/lognormal-fractile';
import { incompleteBeta } from '@embertally/shared/methods/statistics/incomplete-beta';
import { pertFractile } from '@embertally/shared/methods/statistics/pert-fractile';
import { olderUnits } from '@embertally/shared/methods/load/older-units';
import { ruleOfIowa } from '@embertally/shared/methods/water/observed-flows';
import { normalCdf, normalQuantile } from '@embertally/shared/methods/statistics/normal-distribution';

describe('against general-purpose libraries', () => {
  it.each([0.05, 0.5, 0.8, 0.9, 0.95, 0.99])('Gumbel fractile %d agrees with @stdlib', (p) => {
    const [mean, V] = [780, 0.3];
    const beta = (Math.sqrt(6) / Math.PI) * V * mean;
    const expected = gumbelQuantile(p, mean - 0.5772156649 * beta, beta);
    expect(gumbelFractile.run({ mean, V, p })).toBeCloseTo(expected, 4);
    expect(gumbelPlace.run({ q: expected, mean, V })).toBeCloseTo(100 * p, 6);
  });

  it.each([0.05, 0.5, 0.8, 0.95])('lognormal fractile %d agrees with jStat', (p) => {
    const [mean, V] = [747, 833 / 747];
    const sigma = Math.sqrt(Math.log(1 + V * V));
    const expected = jStat.lognormal.inv(p, Math.log(mean) - (sigma * sigma) / 2, sigma);
    expect(lognormalFractile.run({ mean, V, p }) / expected).toBeCloseTo(1, 5);
  });

  it.each([-6, -3.5, -3, -1.645, -0.1, 0, 0.5, 2.999, 3, 5])('standard normal at %d agrees with jStat', (z) => {
    expect(Math.abs(normalCdf(z) - jStat.normal.cdf(z, 0, 1))).toBeLessThan(1e-7);
    expect(normalQuantile(normalCdf(z))).toBeCloseTo(z, 5);
  });

  it('water formed per hydrogen follows from molar masses of mf-parser', () => {
    const water = new MF('H2O').getInfo().mass;
    const hydrogen = new MF('H2').getInfo().mass;
    expect(water / hydrogen / WATER_PER_HYDROGEN).toBeCloseTo(1, 3);
  });

  it('load per floor area keeps its units, by mathjs', () => {
    const expected = unit(13_400, 'MJ').divide(unit(96, 'm^2')) as unknown as { toNumber(unit: string): number };
    expect(perFloor.run({ Q: 13_400, A_f: 96 })).toBeCloseTo(expected.toNumber('MJ/m^2'), 9);
    expect(unit(100_000, 'BTU/ft^2').toNumber('MJ/m^2')).toBeCloseTo(1135.65, 2);
  });

  it.each([
    [0.1, 1, 5],
    [0.5, 2.333, 3.667],
    [0.9, 5, 1],
    [0.02, 3, 3],
  ])('incomplete beta at %d for %d and %d agrees with jStat', (x, alpha, beta) => {
    expect(incompleteBeta(x, alpha, beta)).toBeCloseTo(jStat.beta.cdf(x, alpha, beta), 9);
  });

  it.each([0.05, 0.5, 0.8, 0.95])('PERT fractile %d agrees with jStat', (p) => {
    const { fractile } = pertFractile.run({ a: 10, m: 15, b: 25, p });
    expect(fractile).toBeCloseTo(10 + 15 * jStat.beta.inv(p, 1 + 4 / 3, 1 + 8 / 3), 5);
  });

  it('older units and US gallons are those of mathjs', () => {
    expect(olderUnits.run({ value: 1e5, unit: 'Btu/ft2' })).toBeCloseTo(unit(1e5, 'BTU/ft^2').toNumber('MJ/m^2'), 3);
    const gallons = unit(100, 'm^3').toNumber('ft^3') / 100;
    expect(ruleOfIowa.run({ V: 100 })).toBeCloseTo(unit(gallons, 'gallon').toNumber('litre'), 1);
  });
});
