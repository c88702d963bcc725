import { backOff_s } from '@embertally/web/src/book/sync/back-off.ts';
import { expect, test } from 'vitest';

test('waits double from one second to a minute', () => {
  expect([0, 1, 2, 3, 5, 6, 20].map((attempt) => backOff_s(attempt, 1))).toEqual([1, 2, 4, 8, 32, 60, 60]);
});

test('each wait is drawn between half and the whole', () => {
  expect(backOff_s(3, 0)).toBe(4);
  expect(backOff_s(3, 0.5)).toBe(6);
});
