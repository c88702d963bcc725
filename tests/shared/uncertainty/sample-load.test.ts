import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { LoadModel } from '@embertally/shared/uncertainty/load-model';
import { sampleLoad } from '@embertally/shared/uncertainty/sample-load';
import { loadOf, momentsOfSamples, sampled } from './load-models.ts';

const N = 200_000;
const normal = (mean: number, deviation: number) => ({ kind: 'normal', mean, deviation }) as const;
const triangular = (low: number, mode: number, high: number) => ({ kind: 'triangular', low, mode, high }) as const;

describe('a sampled load', () => {
  const model: LoadModel = {
    materials: [
      { key: 'timber', label: 'Timber' },
      { key: 'foam', label: 'Foam' },
    ],
    heats: [
      { material: 0, distribution: triangular(16, 17.5, 19), moisture: 0 },
      { material: 0, distribution: triangular(15, 16, 17), moisture: 0.6 },
      { material: 1, distribution: triangular(24, 27, 30), moisture: 0 },
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
        mass: normal(1, 0.03),
        cabinet: null,
        terms: [{ heat: 1, mass: 50, inCabinet: false, combustion: 0.8 }],
        characteristic: 1.2,
      },
    ],
  };

  it('has the mean that products of independent inputs have', () => {
    const { total, released, characteristic } = sampled(model, N);
    // By hand: means of the triangles are thirds of their three points.
    const cabinet = 1.85 / 3;
    const expected = { a: 100 * cabinet * 17.5 + 20 * 27, b: 50 * 16 };
    expect(momentsOfSamples(total).mean / (expected.a + expected.b)).toBeCloseTo(1, 2);
    const free = 0.8 * 100 * cabinet * 17.5 + 20 * 27 + 0.8 * 50 * 16;
    expect(momentsOfSamples(released).mean / free).toBeCloseTo(1, 2);
    expect(momentsOfSamples(characteristic).mean / (expected.a + 1.2 * expected.b)).toBeCloseTo(1, 2);
  });

  it('is the same for the same seed and another for another', () => {
    expect(sampled(model, 3000, 5)).toEqual(sampled(model, 3000, 5));
    expect(sampled(model, 3000, 5)).not.toEqual(sampled(model, 3000, 6));
  });

  it('keeps the first samples when more are drawn', () => {
    expect(sampled(model, 5000).total.slice(0, 700)).toEqual(sampled(model, 700).total);
  });

  it('does not depend on the order of the entries beyond rounding', () => {
    const turned = sampled({ ...model, entries: [...model.entries].reverse() }, 2000).total;
    sampled(model, 2000).total.forEach((value, i) => expect(turned[i]! / value).toBeCloseTo(1, 12));
  });

  it('keeps the samples of an entry when another one comes', () => {
    const alone = sampled({ ...model, entries: model.entries.slice(0, 1) }, 1000).total;
    const other = sampled({ ...model, entries: model.entries.slice(1) }, 1000).total;
    sampled(model, 1000).total.forEach((value, i) => expect(alone[i]! + other[i]!).toBeCloseTo(value, 9));
  });

  it('tells how far it is and can be left at any step', () => {
    const run = sampleLoad(model, 5000, 1);
    const first = run.next();
    expect(first.done).toBe(false);
    expect(first.value).toBeGreaterThan(0);
    expect(first.value).toBeLessThan(1);
    let last = 0;
    for (const share of sampleLoad(model, 5000, 1)) {
      expect(share).toBeGreaterThan(last);
      last = share;
    }
    expect(last).toBe(1);
  });

  it('of nothing is nothing', () => {
    expect([...sampled({ materials: [], heats: [], entries: [] }, 3).total]).toEqual([0, 0, 0]);
  });

  it('never goes below zero and stays finite, whatever the spreads', () => {
    fc.assert(
      fc.property(
        fc.array(
          fc.tuple(fc.double({ min: 0.01, max: 1.5, noNaN: true }), fc.double({ min: 0, max: 60, noNaN: true })),
          {
            minLength: 1,
            maxLength: 6,
          },
        ),
        fc.nat(),
        (items, seed) => {
          const { total } = sampled(
            loadOf(
              items.map(([spread, heat]) => ({
                mass: { kind: 'lognormal', mean: 1, deviation: spread },
                heat: triangular(heat * 0.5, heat, heat * 2),
              })),
            ),
            600,
            seed,
          );
          for (const value of total) expect(Number.isFinite(value) && value >= 0).toBe(true);
        },
      ),
      { numRuns: 40 },
    );
  });
});
