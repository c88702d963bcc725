import { readNumber } from '@embertally/shared/units/read-number';
import { describe, expect, it } from 'vitest';

describe('readNumber', () => {
  it.each([
    ['12.5', 12.5],
    ['12,5', 12.5],
    [' 7 ', 7],
    ['.5', 0.5],
    ['0,123', 0.123],
    ['1,2345', 1.2345],
    ['1234,567', 1234.567],
    ['1.234', 1.234],
    ['1 200', 1200],
    ['1\u00a0200,5', 1200.5],
    ['1\u202f234\u202f567', 1_234_567],
    ['1,234,567', 1_234_567],
    ['1.234.567', 1_234_567],
    ['1,234.5', 1234.5],
    ['1.234,5', 1234.5],
    ['-3', -3],
    ['−3,5', -3.5],
    ['+4', 4],
    ['1e3', 1000],
    ['6 1/2', 6.5],
    ['6½', 6.5],
    ['3/4', 0.75],
  ])('reads %s', (text, value) => {
    expect(readNumber(text)).toEqual({ kind: 'number', value });
  });

  it.each([
    '',
    'twelve',
    '1 20',
    '1 2000',
    '1,23,456',
    '12..5',
    '1,,2',
    '1/0',
    '.',
    ',',
    '-',
    '--3',
    '1e999',
    '0x10',
    'Infinity',
  ])('does not take “%s” for a number', (text) => {
    expect(readNumber(text)).toEqual({ kind: 'not a number' });
  });

  it.each(['1,234', '12,500', '999,000'])(
    'finds %s ambiguous as long as nobody said which mark starts the decimals',
    (text) => {
      expect(readNumber(text)).toEqual({
        kind: 'ambiguous',
        grouped: Number(text.replace(',', '')),
        decimal: Number(text.replace(',', '.')),
      });
    },
  );

  it('keeps the sign of an ambiguous number', () => {
    expect(readNumber('−1,234')).toEqual({ kind: 'ambiguous', grouped: -1234, decimal: -1.234 });
  });

  it.each([
    ['1,234', 'comma', 1.234],
    ['1,234', 'point', 1234],
    ['1.234', 'point', 1.234],
    ['1.234', 'comma', 1234],
  ] as const)('reads %s with a decimal %s as it was answered', (text, decimal, value) => {
    expect(readNumber(text, decimal)).toEqual({ kind: 'number', value });
  });
});
