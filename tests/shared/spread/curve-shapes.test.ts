import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { measuredCurve } from '@embertally/shared/spread/measured-curve';
import { ownCurve, rateAt, timeToRate } from '@embertally/shared/spread/own-curve';
import { thinCurve } from '@embertally/shared/spread/thin-curve';
import { areaOf, spreadEntry } from '../../support/spread-samples.ts';

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const curves = (maxLength: number) =>
  fc
    .array(fc.tuple(number(0.5, 20), number(0, 3000)), { minLength: 2, maxLength })
    .map((steps) => {
      let t = 0;
      return steps.map(([dt, rate]): [number, number] => [(t += dt), rate]);
    })
    .filter((points) => areaOf(points) > 0.01);

describe('a thinned curve', () => {
  it('keeps its ends and its area, and runs through points of the whole one', () => {
    fc.assert(
      fc.property(curves(400), (points) => {
        const thin = thinCurve(points);
        expect(thin[0]).toBe(points[0]);
        expect(thin.at(-1)).toBe(points.at(-1));
        expect(Math.abs(areaOf(thin) / areaOf(points) - 1)).toBeLessThan(0.0006);
        expect(thin.every((point) => points.includes(point as [number, number]))).toBe(true);
      }),
      { numRuns: 60 },
    );
  });

  it('needs two points for an hour of the same rate, and keeps a jump', () => {
    const flat = Array.from({ length: 3601 }, (_, t): [number, number] => [t, 500]);
    expect(thinCurve(flat)).toEqual([
      [0, 500],
      [3600, 500],
    ]);
    expect(thinCurve([...flat, [3600, 900], [3700, 900], [3800, 900]])).toEqual([
      [0, 500],
      [3600, 500],
      [3600, 900],
      [3800, 900],
    ]);
  });
});

it('a curve of half a million points is thinned as well', () => {
  const long = Array.from({ length: 500_000 }, (_, k): [number, number] => [k / 100, 700]);
  expect(thinCurve(long)).toHaveLength(2);
});

describe('a measured curve', () => {
  it('of many points keeps its heat in 60 pieces', () => {
    fc.assert(
      fc.property(curves(600), (points) => {
        const fewer = measuredCurve(points);
        expect(Math.abs(areaOf(fewer) / areaOf(points) - 1)).toBeLessThan(1e-9);
        expect(fewer.length).toBeLessThanOrEqual(120);
        if (points.length <= 61) expect(fewer).toBe(points);
      }),
      { numRuns: 60 },
    );
  });

  it('that begins late gives nothing before', () => {
    const points = [
      [50, 100],
      [150, 100],
    ] as const;
    const curve = ownCurve(spreadEntry('a', [0, 0], { heat_MJ: 10, growth: { by: 'measured', points } }));
    expect(rateAt(curve, 49)).toBe(0);
    expect(rateAt(curve, 51)).toBe(100);
    expect(rateAt(curve, 151)).toBe(0);
    expect(timeToRate(curve, 100)).toBe(50);
    expect(timeToRate(curve, 101)).toBe(Infinity);
  });
});

describe('the curve of an entry', () => {
  it('without a plateau peaks where 70 % of its heat is released', () => {
    const alpha_kW_s2 = 0.05;
    const curve = ownCurve(
      spreadEntry('a', [0, 0], { heat_MJ: 20, peak_kW: 5000, growth: { by: 't-squared', alpha_kW_s2 } }),
    );
    const t = Math.cbrt((3 * 0.7 * 20_000) / alpha_kW_s2);
    expect(curve.peak).toBeCloseTo(alpha_kW_s2 * t * t, 6);
    expect(timeToRate(curve, curve.peak)).toBeCloseTo(t, 6);
    expect(rateAt(curve, curve.end)).toBe(0);
  });
});
