import { describe, expect, it } from 'vitest';
import { triangularDeviation, triangularMean } from '@embertally/shared/uncertainty/triangular';

describe('a triangular distribution', () => {
  it('of 10, 15, 25 has the mean and deviation of the textbooks', () => {
    expect(triangularMean(10, 15, 25)).toBeCloseTo(16.66667, 5);
    expect(triangularDeviation(10, 15, 25)).toBeCloseTo(3.11805, 5);
  });
  it('of one value has no deviation', () => {
    expect(triangularDeviation(17.5, 17.5, 17.5)).toBe(0);
  });
});
