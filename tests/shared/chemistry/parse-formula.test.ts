import { MF } from 'mf-parser';
import { describe, expect, it } from 'vitest';
import { molarMass } from '@embertally/shared/chemistry/molar-mass';
import { parseFormula } from '@embertally/shared/chemistry/parse-formula';
import { atoms } from '../../reference/atoms.ts';

function read(text: string) {
  const parsed = parseFormula(text);
  if (!parsed.ok) throw new Error(parsed.message);
  return parsed.atoms;
}

function refusal(text: string) {
  const parsed = parseFormula(text);
  if (parsed.ok) throw new Error(`${text} was read.`);
  return parsed;
}

describe('reading a formula', () => {
  it.each([
    ['C8H18', atoms({ C: 8, H: 18 })],
    ['CH3(CH2)6CH3', atoms({ C: 8, H: 18 })],
    [' C2 H5 OH ', atoms({ C: 2, H: 6, O: 1 })],
    ['C₂H₅OH', atoms({ C: 2, H: 6, O: 1 })],
    ['C6H12O6·H2O', atoms({ C: 6, H: 14, O: 7 })],
    ['C2H2O4*2H2O', atoms({ C: 2, H: 6, O: 6 })],
    ['(C2H4)n', atoms({ C: 2, H: 4 })],
    ['[CH2(CHCl)]2', atoms({ C: 4, H: 6, Cl: 2 })],
    ['CH1.44O0.66', atoms({ C: 1, H: 1.44, O: 0.66 })],
    ['CBrF3', atoms({ C: 1, Br: 1, F: 3 })],
    ['HCN', atoms({ C: 1, H: 1, N: 1 })],
    ['CO', atoms({ C: 1, O: 1 })],
  ])('%s', (text, expected) => expect(read(text)).toEqual(expected));

  it.each([
    ['', 'empty'],
    ['   ', 'empty'],
    ['2 C8H18', 'moles'],
    ['C8H18+', 'neutral'],
    ['SO4^2-', 'neutral'],
    ['(CH2', 'not closed'],
    ['CH2)', 'never opened'],
    ['(CH2]3', 'not closed'],
    ['()2', 'nothing between'],
    ['CH4·', 'nothing between'],
    ['C0H4', 'count of 0'],
    ['CH4,5', 'point'],
    ['Co', 'cobalt'],
    ['NaCl', 'Na is not covered'],
    ['co2', 'capital'],
    ['C8H18?', 'no place'],
    ['日本', 'no place'],
    ['C999999999', 'more than'],
    ['(C99999H)99999', 'repeat unit'],
    ['('.repeat(60) + 'C' + ')'.repeat(60), 'deep'],
    ['C'.repeat(10_000), 'longer'],
    ['C\u0000', 'no place'],
  ])('refuses %j', (text, why) => expect(refusal(text).message).toContain(why));

  it('points at the sign it stumbled over', () => {
    expect(refusal('C8H18?').at).toBe(5);
    expect(refusal('C6(H5').at).toBe(2);
  });

  it.each(['C4H10', 'C12H22O11', 'C3H6N6', 'C2H3Cl', 'C6H10O5', 'CS2', 'CHBr3', 'C2F4', 'C16H14O3', 'CH3(CH2)16COOH'])(
    'molar mass of %s agrees with mf-parser',
    (formula) => {
      expect(molarMass(read(formula)) / new MF(formula).getInfo().mass - 1).toBeCloseTo(0, 3);
    },
  );
});
