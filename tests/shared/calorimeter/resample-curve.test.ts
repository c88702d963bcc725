import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { placeCurve } from '@embertally/shared/calorimeter/place-curve';
import { resampleCurve } from '@embertally/shared/calorimeter/resample-curve';
import '../../support/property-seed.ts';
import { areaOf, csv, preview } from './calorimeter-files.ts';

const curveOf = (steps: readonly number[], rates: readonly number[]) => {
  let time = 0;
  return {
    time_s: Float64Array.from(steps, (step) => (time += step)),
    rate: Float64Array.from(rates),
  };
};
const points = ({ time_s, rate }: ReturnType<typeof curveOf>) => [...rate].map((q, i) => [time_s[i] ?? 0, q] as const);

describe('a curve of at most 300 points', () => {
  it('keeps area, peak, ends and order, whatever the curve', () => {
    const lengths = fc.integer({ min: 3, max: 9000 });
    const curves = lengths.chain((length) =>
      fc.record({
        seed: fc.integer({ min: 1, max: 1e9 }),
        length: fc.constant(length),
        spikes: fc.integer({ min: 0, max: 20 }),
      }),
    );
    fc.assert(
      fc.property(curves, ({ seed, length, spikes }) => {
        let state = seed;
        const chance = () => (state = (state * 48_271) % 2_147_483_647) / 2_147_483_647;
        const steps = Array.from({ length }, () => 0.01 + chance());
        const rates = Array.from(
          { length },
          (_, i) => chance() * 20 + (chance() * length < spikes ? 900 : 0) + (i % 97),
        );
        const curve = curveOf(steps, rates);
        const kept = resampleCurve(curve, 300);
        expect(kept.length).toBeLessThanOrEqual(300);
        expect(Math.abs(areaOf(kept) / areaOf(points(curve)) - 1)).toBeLessThan(0.001);
        expect(Math.max(...kept.map(([, q]) => q))).toBe(Math.max(...rates));
        expect(kept[0]?.[0]).toBe(curve.time_s[0]);
        expect(kept.at(-1)?.[0]).toBe(curve.time_s.at(-1));
        expect(kept.every(([t, q], i) => q >= 0 && (i === 0 || t > (kept[i - 1]?.[0] ?? 0)))).toBe(true);
      }),
      { numRuns: 60 },
    );
  });

  it('leaves a short curve as it is', () => {
    const curve = curveOf([1, 1, 1], [0, 5, 0]);
    expect(resampleCurve(curve, 300)).toEqual(points(curve));
  });

  it('keeps a single spike in a long quiet curve', () => {
    const rates = Array.from({ length: 20_000 }, (_, i) => (i === 12_345 ? 800 : 1));
    const kept = resampleCurve(
      curveOf(
        rates.map(() => 1),
        rates,
      ),
      300,
    );
    expect(kept.find(([, q]) => q === 800)?.[0]).toBe(12_346);
  });
});

describe('a curve that is placed', () => {
  it('is multiplied, with its times unchanged', () => {
    const { curve } = preview(csv('Time (s),HRR (kW/m2)', '0,0', '60,200', '180,0'));
    expect(placeCurve(curve?.points ?? [], 4)).toEqual([
      [0, 0],
      [60, 800],
      [180, 0],
    ]);
  });
});

describe('a million readings', () => {
  it('are read and resampled like a few', () => {
    const lines = ['Time (s),HRR (kW)'];
    for (let i = 0; i < 1_000_000; i += 1) lines.push(`${(i / 10).toFixed(1)},${((i % 5000) / 5).toFixed(1)}`);
    const text = lines.join('\n');
    const read = preview(text);
    expect(read.readings).toBe(1_000_000);
    expect(read.points.length).toBeLessThanOrEqual(300);
    expect(Math.abs(areaOf(read.points) / 1000 / read.heat_MJ - 1)).toBeLessThan(0.001);
    expect(read.peak).toBe(999.8);
  }, 60_000);
});
