import { describe, expect, it } from 'vitest';
import { fillSamples } from '@embertally/shared/uncertainty/fill-samples';
import type { Distribution } from '@embertally/shared/uncertainty/distribution';
import type { LoadModel } from '@embertally/shared/uncertainty/load-model';
import { varianceShares } from '@embertally/shared/uncertainty/variance-shares';
import { seededRandom } from '../../support/seeded-random.ts';
import { loadOf, momentsOfSamples, point, sampled } from './load-models.ts';

const NOTHING = { overlooked: point(0), floor: { kind: 'normal', mean: 1, deviation: 0 } as const };
const triangular = (low: number, mode: number, high: number) => ({ kind: 'triangular', low, mode, high }) as const;
const ROOM = { overlooked: triangular(0, 0.05, 0.15), floor: { kind: 'normal', mean: 1, deviation: 0.05 } as const };

const MODEL: LoadModel = {
  materials: [
    { key: 'timber', label: 'Timber' },
    { key: 'foam', label: 'Foam' },
  ],
  heats: [
    { material: 0, distribution: triangular(15, 17, 22), moisture: 0 },
    { material: 0, distribution: triangular(14, 16, 17), moisture: 0.7 },
    { material: 1, distribution: triangular(20, 27, 30), moisture: 0 },
  ],
  entries: [
    {
      id: 'a',
      label: 'A',
      mass: { kind: 'lognormal', mean: 1, deviation: 0.3 },
      cabinet: triangular(0, 0.85, 1),
      terms: [
        { heat: 0, mass: 100, inCabinet: true, combustion: 0.8 },
        { heat: 2, mass: 20, inCabinet: false, combustion: 1 },
      ],
      characteristic: 1,
    },
    {
      id: 'b',
      label: 'B',
      mass: { kind: 'lognormal', mean: 1, deviation: 0.2 },
      cabinet: null,
      terms: [{ heat: 1, mass: 90, inCabinet: false, combustion: 0.8 }],
      characteristic: 1,
    },
  ],
};

/** The density of {@link MODEL} from one uniform number an input, written down by hand. */
const INPUTS: readonly { readonly of: string; readonly spread: Distribution }[] = [
  { of: 'mass 0', spread: MODEL.entries[0]!.mass },
  { of: 'mass 1', spread: MODEL.entries[1]!.mass },
  { of: 'enclosure 0', spread: triangular(0, 0.85, 1) },
  { of: 'heat 0', spread: triangular(0, 0.5, 1) },
  { of: 'heat 0', spread: { kind: 'normal', mean: 0, deviation: 1 } },
  { of: 'heat 1', spread: MODEL.heats[2]!.distribution },
  { of: 'overlooked 0', spread: ROOM.overlooked },
  { of: 'floor 0', spread: ROOM.floor },
];

function density(u: readonly number[]): number {
  const at = (spread: Distribution, place: number) => {
    const out = Float64Array.of(u[place]!);
    fillSamples(spread)(out, out, 1);
    return out[0]!;
  };
  const [massA, massB, psi] = [0, 1, 2].map((place) => at(INPUTS[place]!.spread, place));
  const timber = at(MODEL.heats[0]!.distribution, 3);
  const moist = at(MODEL.heats[1]!.distribution, 3) - 0.7 * at(INPUTS[4]!.spread, 4);
  const foam = at(INPUTS[5]!.spread, 5);
  const load = massA! * (100 * psi! * timber + 20 * foam) + massB! * 90 * moist;
  return (load * (1 + at(ROOM.overlooked, 6))) / at(ROOM.floor, 7);
}

describe('what the variance comes from', () => {
  it('is shared as Sobol’ indices estimated by picking and freezing', () => {
    // Saltelli 2010: S_j = E[f(B) (f(A with column j of B) − f(A))] / Var, with 25,000 rows.
    const rows = 25_000;
    const random = seededRandom(11);
    const groups = [...new Set(INPUTS.map(({ of }) => of))];
    const sums = new Map(groups.map((group) => [group, 0]));
    const values = new Float64Array(rows);
    const mean = varianceShares(MODEL, ROOM).mean;
    for (let row = 0; row < rows; row += 1) {
      const a = INPUTS.map(() => random());
      const b = INPUTS.map(() => random());
      const [fa, fb] = [density(a), density(b)];
      values[row] = fa;
      for (const group of groups) {
        const mixed = a.map((value, j) => (INPUTS[j]!.of === group ? b[j]! : value));
        sums.set(group, sums.get(group)! + (fb - mean) * (density(mixed) - fa));
      }
    }
    const { deviation } = momentsOfSamples(values);
    const exact = varianceShares(MODEL, ROOM);
    for (const part of exact.parts) {
      const estimated = sums.get(`${part.of} ${part.index}`)! / rows / deviation ** 2;
      const apart = Math.abs(part.variance / exact.variance - estimated);
      expect(apart, `${part.of} ${part.index}`).toBeLessThan(0.03);
    }
    expect(exact.mean / momentsOfSamples(values).mean).toBeCloseTo(1, 2);
    expect(Math.sqrt(exact.variance) / (deviation / exact.mean)).toBeCloseTo(1, 1.7);
  });

  it('has the variance the samples have', () => {
    const { mean, deviation } = momentsOfSamples(sampled(MODEL, 400_000).total);
    const exact = varianceShares(MODEL, NOTHING);
    expect(exact.mean / mean).toBeCloseTo(1, 2);
    expect(Math.sqrt(exact.variance) / (deviation / mean)).toBeCloseTo(1, 2);
  });

  it('of a load of known heats is that of the masses, squared and added', () => {
    const mass = (deviation: number) => ({ kind: 'normal', mean: 100, deviation }) as const;
    const { variance, parts } = varianceShares(
      loadOf([
        { mass: mass(30), heat: point(10) },
        { mass: mass(10), heat: point(10) },
      ]),
      NOTHING,
    );
    // (300² + 100²)/2000²
    expect(variance).toBeCloseTo(0.025, 12);
    expect(parts.filter(({ of }) => of === 'mass').map((part) => part.variance / variance)).toEqual([
      expect.closeTo(0.9, 12),
      expect.closeTo(0.1, 12),
    ]);
  });

  it('adds up to no more than all of it, and to all of it where inputs only add', () => {
    const { variance, parts } = varianceShares(MODEL, ROOM);
    const sum = parts.reduce((total, part) => total + part.variance, 0);
    expect(sum).toBeLessThan(variance);
    expect(sum).toBeGreaterThan(0.9 * variance);
  });

  it('of nothing is nothing', () => {
    expect(varianceShares({ materials: [], heats: [], entries: [] }, ROOM)).toEqual({
      variance: 0,
      mean: 0,
      parts: [],
    });
  });
});
