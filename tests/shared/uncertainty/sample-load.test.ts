import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { quantileOf } from '@embertally/shared/uncertainty/distribution';
import type { LoadModel } from '@embertally/shared/uncertainty/load-model';
import { sampleLoad } from '@embertally/shared/uncertainty/sample-load';
import { fractile, loadOf, momentsOfSamples, point, sampled } from './load-models.ts';

const N = 200_000;
const normal = (mean: number, deviation: number) => ({ kind: 'normal', mean, deviation }) as const;
const triangular = (low: number, mode: number, high: number) => ({ kind: 'triangular', low, mode, high }) as const;

describe('a sampled load against the outside world', () => {
  it('of two items is that of two million samples drawn with numpy', () => {
    const { total } = sampled(
      loadOf([
        { mass: triangular(80, 100, 130), heat: normal(17.5, 1) },
        { mass: triangular(30, 50, 80), heat: normal(20, 2) },
      ]),
      N,
    );
    const { mean, deviation } = momentsOfSamples(total);
    expect(mean / 2875).toBeCloseTo(1, 2);
    expect(deviation / 311.8).toBeCloseTo(1, 2);
    expect(fractile(total, 0.8) / 3138.8).toBeCloseTo(1, 2);
    expect(fractile(total, 0.95) / 3409.9).toBeCloseTo(1, 2);
  });

  it('of four normal inputs has the interval of JCGM 101:2008, 9.2.2 (table 2)', () => {
    // Masses around 10 kg of 1 MJ/kg stand for inputs of mean 0 and standard deviation 1: printed −3.92 to 3.92.
    const { total } = sampled(loadOf(Array.from({ length: 4 }, () => ({ mass: normal(10, 1), heat: point(1) }))), N);
    expect(momentsOfSamples(total).deviation).toBeCloseTo(2, 1);
    expect(fractile(total, 0.025) - 40).toBeCloseTo(-3.92, 1);
    expect(fractile(total, 0.975) - 40).toBeCloseTo(3.92, 1);
  });

  it('of four rectangular inputs, two and two as triangles, has the interval of JCGM 101:2008, 9.2.3 (table 3)', () => {
    // The sum of two rectangles of standard deviation 1 is a triangle of half width 2√3: printed −3.88 to 3.88.
    const half = 2 * Math.sqrt(3);
    const mass = triangular(10 - half, 10, 10 + half);
    const { total } = sampled(
      loadOf([
        { mass, heat: point(1) },
        { mass, heat: point(1) },
      ]),
      N,
    );
    expect(fractile(total, 0.025) - 20).toBeCloseTo(-3.88, 1);
    expect(fractile(total, 0.975) - 20).toBeCloseTo(3.88, 1);
  });

  it('with one heat for two items has the correlated uncertainty of GUM 5.2.2', () => {
    const item = (kg: number, u: number) => ({ mass: normal(kg, u), heat: normal(17.5, 1), material: 'timber' });
    const { total } = sampled(loadOf([item(100, 10), item(80, 8)]), N);
    // 287.446 to first order; the products of two deviations add 12.8² to its square.
    expect(momentsOfSamples(total).deviation / Math.hypot(287.446, Math.hypot(10, 8))).toBeCloseTo(1, 2);
  });

  it('of one item of known heat is the distribution of its mass, place by place', () => {
    const mass = { kind: 'lognormal', mean: 420, deviation: 126 } as const;
    const { total } = sampled(loadOf([{ mass, heat: point(1) }]), N);
    expect(fractile(total, 0.95) / 651.99).toBeCloseTo(1, 2);
    for (const p of [0.05, 0.5, 0.8]) expect(fractile(total, p) / quantileOf(mass, p)).toBeCloseTo(1, 2);
  });
});

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
