import { describe, expect, it } from 'vitest';
import { axisTicks } from '../../../../api/src/reports/layout/axis-ticks.ts';

describe('axisTicks', () => {
  it.each([
    [9.6, 5, [0, 2, 4, 6, 8, 10]],
    [26_200, 5, [0, 10_000, 20_000, 30_000]],
    [1, 5, [0, 0.2, 0.4, 0.6, 0.8, 1]],
    [0.0123, 4, [0, 0.005, 0.01, 0.015]],
    [0, 5, [0, 0.2, 0.4, 0.6, 0.8, 1]],
  ])('up to %s in about %s steps', (most, count, expected) => {
    expect(axisTicks(most, count)).toEqual(expected);
  });
});
