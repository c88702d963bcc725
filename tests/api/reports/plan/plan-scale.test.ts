import { describe, expect, it } from 'vitest';
import { planScale } from '../../../../api/src/reports/plan/plan-scale.ts';

const MILLIMETRES_PER_POINT = 25.4 / 72;

describe('planScale', () => {
  it.each([
    [10, 6, 75],
    [15, 10, 100],
    [18, 18, 125],
    [30, 20, 200],
    [1.5, 1, 20],
    [180, 90, 1250],
    [10_000, 4_000, 75_000],
  ])('a plan of %s m × %s m on 170 mm × 200 mm is drawn 1:%s', (width, depth, ratio) => {
    const box = [170 / MILLIMETRES_PER_POINT, 200 / MILLIMETRES_PER_POINT] as const;
    expect(planScale(width, depth, ...box).ratio).toBe(ratio);
  });

  it('is true: a metre at 1:100 is ten millimetres', () => {
    const { ratio, pointsPerMetre } = planScale(15, 10, 482, 567);
    expect(ratio).toBe(100);
    expect(pointsPerMetre * MILLIMETRES_PER_POINT).toBeCloseTo(10, 9);
  });
});
