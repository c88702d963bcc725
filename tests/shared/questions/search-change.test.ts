import { describe, expect, it } from 'vitest';
import { searchChange } from '@embertally/shared/questions/search-change';

const word = (is: boolean) => (is ? 'yes' : 'no');

describe('the search for a change', () => {
  it('pins a change down to the tolerance, on the right side of it', () => {
    const found = searchChange({ from: 0, to: 10, tolerance: 0.001 }, (x) => ({
      state: word(x * x >= 2),
      value: x * x,
    }));
    if (!found.found) throw new Error('There is a change at the root of 2.');
    expect(found.after.x).toBeGreaterThanOrEqual(Math.SQRT2);
    expect(found.before.x).toBeLessThan(Math.SQRT2);
    expect(found.after.x - found.before.x).toBeLessThanOrEqual(0.001001);
    expect(found.jump).toBe(false);
  });

  it('searches downwards as well', () => {
    const found = searchChange({ from: 10, to: 0, tolerance: 0.001 }, (x) => ({ state: word(x < 3), value: null }));
    if (!found.found) throw new Error('There is a change at 3.');
    expect(found.after.x).toBeLessThan(3);
    expect(found.before.x).toBeGreaterThanOrEqual(3);
  });

  it('tells a leap of the number behind the reading from a slope', () => {
    const leap = searchChange({ from: 0, to: 1, tolerance: 0.001 }, (x) => ({
      state: word(x > 0.4),
      value: x > 0.4 ? 900 : 600,
    }));
    expect(leap.found && leap.jump).toBe(true);
  });

  it('takes the first of several changes and counts the others', () => {
    const found = searchChange({ from: 0, to: 10, tolerance: 0.001 }, (x) => ({
      state: word((x > 2 && x < 4) || x > 7),
      value: null,
    }));
    if (!found.found) throw new Error('There are three changes.');
    expect(found.after.x).toBeCloseTo(2, 2);
    expect(found.further).toBe(2);
  });

  it('finds the largest whole number that keeps, wherever it lies', () => {
    for (const most of [0, 1, 2, 3, 7, 8, 9, 1000, 4095, 4096, 99_999]) {
      const found = searchChange({ from: 0, to: 100_000, tolerance: 1, whole: true, steps: 'doubling' }, (n) => ({
        state: word(n > most),
        value: n,
      }));
      if (!found.found) throw new Error(`There is a change after ${most}.`);
      expect([found.before.x, found.after.x]).toEqual([most, most + 1]);
    }
  });

  it('gives no answer where nothing changes, where it is so from the start, and where there is nothing to search', () => {
    const same = searchChange({ from: 1, to: 2, tolerance: 0.1 }, () => ({ state: 'same', value: 5 }));
    expect(same.found).toBe(false);
    const already = searchChange(
      { from: 1, to: 2, tolerance: 0.1 },
      () => ({ state: 'passed', value: 5 }),
      (state) => state === 'passed',
    );
    expect(already.found).toBe(false);
    expect(already.looks).toBe(1);
    const nowhere = searchChange({ from: 2, to: 2, tolerance: 0.1 }, () => ({ state: 'same', value: 5 }));
    expect(nowhere.found).toBe(false);
  });
});
