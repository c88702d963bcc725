import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { standingOf } from '@embertally/shared/limits/standing';

describe('standing', () => {
  it.each([
    [899.99999, 1000, 'within'],
    [900, 1000, 'near'],
    [1000, 1000, 'near'],
    [1000.0001, 1000, 'over'],
    [0, 1000, 'within'],
    [null, 1000, 'no limit set'],
    [500, null, 'no limit set'],
    [500, 0, 'no limit set'],
  ] as const)('%d against %d is %s', (value, bound, expected) => {
    expect(standingOf(value, bound)).toBe(expected);
  });

  it('never gets better as the value grows', () => {
    const rank = { within: 0, near: 1, over: 2, 'no limit set': -1 };
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 1e6, noNaN: true }),
        fc.double({ min: 0, max: 1e6, noNaN: true }),
        (a, b) => {
          const [low, high] = [Math.min(a, b), Math.max(a, b)];
          expect(rank[standingOf(high, 1000)]).toBeGreaterThanOrEqual(rank[standingOf(low, 1000)]);
        },
      ),
    );
  });
});
