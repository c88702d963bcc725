import { dateWords } from '@embertally/web/src/lib/date-words.ts';
import { expect, test } from 'vitest';

test('an instant reads in the hours of the zone that is meant', () => {
  expect(dateWords('2026-12-01T23:36:00.000Z', 'moment', 'Europe/London')).toBe('1 Dec 2026, 23:36');
  expect(dateWords('2026-12-01T23:36:00.000Z', 'moment', 'Pacific/Auckland')).toBe('2 Dec 2026, 12:36');
});

test('a day without a time is the same day in every zone', () => {
  expect(dateWords('2026-03-12', 'day')).toBe('12 Mar 2026');
  expect(dateWords('2026-03-12', 'day', 'America/Los_Angeles')).toBe('12 Mar 2026');
});

test('the day of the week is said without a comma', () => {
  expect(dateWords('2026-12-01T12:00:00.000Z', 'weekday', 'UTC')).toBe('Tuesday 1 December 2026');
});
