import { describe, expect, it } from 'vitest';
import { readEquation } from '@embertally/shared/chemistry/read-equation';

const read = (text: string) => {
  const result = readEquation(text);
  return result.ok ? result.equation : result.message;
};

describe('an equation of combustion', () => {
  it.each([
    ['2 C8H18 + 25 O2 -> 16 CO2 + 18 H2O(g)', 'C8H18', 2, 25, 'vapour'],
    ['C8H18 + 12.5 O2 → 8 CO2 + 9 H2O', 'C8H18', 1, 12.5, null],
    ['C8H18+25/2 O2 = 8CO2+9H2O(l)', 'C8H18', 1, 12.5, 'liquid'],
    ['O2 + 2 CO ⟶ 2 CO2', 'CO', 2, 1, null],
    ['C6H5COOH(s) + 7.5O2(g) => 7 CO2(g) + 3 H2O(l)', 'C6H5COOH', 1, 7.5, 'liquid'],
  ])('%s', (text, formula, moles, oxygen, water) => {
    expect(read(text)).toMatchObject({ formula, moles, oxygen, water });
  });

  it.each([
    ['2 C8H18 + 24 O2 -> 16 CO2 + 18 H2O', /does not balance in O \(48 left, 50 right\)/],
    ['C8H18 + O2', /one arrow/],
    ['', /one arrow/],
    ['CH4 + 2 O2 + 8 N2 -> CO2 + 2 H2O + 8 N2', /one fuel/],
    ['CH4 -> C + 2 H2', /no oxygen/],
    ['Xy + O2 -> CO2', /cannot be read/],
    ['0 CH4 + 0 O2 -> CO2', /above 0/],
    ['CH4 + + O2 -> CO2', /cannot be read/],
    ['1/0 CH4 + 2 O2 -> CO2 + 2 H2O', /above 0/],
  ])('%s is refused with what to change', (text, message) => {
    expect(read(text)).toMatch(message);
  });
});
