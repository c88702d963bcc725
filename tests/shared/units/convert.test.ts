import { convert } from '@embertally/shared/units/convert';
import { UNIT_TABLE } from '@embertally/shared/units/unit-table';
import { findUnit } from '@embertally/shared/units/find-unit';
import { unit } from 'mathjs';
import { describe, expect, it } from 'vitest';

/** Spelled as mathjs spells them; its BTU is the International Table one. */
const PAIRS: readonly (readonly [from: string, to: string, mathFrom: string, mathTo: string])[] = [
  ['m', 'ft', 'm', 'ft'],
  ['m', 'in', 'm', 'in'],
  ['yd', 'm', 'yard', 'm'],
  ['m2', 'ft2', 'm^2', 'ft^2'],
  ['m3', 'ft3', 'm^3', 'ft^3'],
  ['L', 'gal', 'L', 'gallon'],
  ['kg', 'lb', 'kg', 'lbm'],
  ['kg', 'oz', 'kg', 'oz'],
  ['t', 'kg', 'tonne', 'kg'],
  ['°C', '°F', 'degC', 'degF'],
  ['MJ', 'Btu', 'MJ', 'BTU'],
  ['kWh', 'MJ', 'kWh', 'MJ'],
  ['kW', 'Btu/s', 'kW', 'BTU/s'],
  ['MJ/m2', 'Btu/ft2', 'MJ/m^2', 'BTU/ft^2'],
  ['MJ/kg', 'Btu/lb', 'MJ/kg', 'BTU/lbm'],
  ['MJ/m', 'Btu/ft', 'MJ/m', 'BTU/ft'],
  ['MJ/m3', 'Btu/ft3', 'MJ/m^3', 'BTU/ft^3'],
  ['kW/m2', 'Btu/s ft2', 'kW/m^2', 'BTU/s/ft^2'],
  ['kg/m3', 'lb/ft3', 'kg/m^3', 'lbm/ft^3'],
  ['kg/m2', 'lb/ft2', 'kg/m^2', 'lbm/ft^2'],
  ['kg/m', 'lb/ft', 'kg/m', 'lbm/ft'],
  ['W/mK', 'Btu/h ft °F', 'W/(m K)', 'BTU/(hour ft degR)'],
  ['J/kgK', 'Btu/lb °F', 'J/(kg K)', 'BTU/(lbm degR)'],
  ['min', 's', 'minute', 's'],
  ['h', 's', 'hour', 's'],
];

describe('convert', () => {
  it.each(PAIRS)('%s to %s agrees with mathjs to ten figures', (from, to, mathFrom, mathTo) => {
    for (const value of [0.037, 1, 512.4, 68_000]) {
      const expected = unit(value, mathFrom).toNumber(mathTo);
      expect(Math.abs(convert(value, from, to) / expected - 1)).toBeLessThan(1e-8);
    }
  });

  it('uses the factors that are exact by definition', () => {
    expect(convert(1, 'ft', 'm')).toBe(0.3048);
    expect(convert(1, 'lb', 'kg')).toBe(0.45359237);
    expect(convert(1, 'Btu', 'MJ')).toBe(1055.05585262e-6);
    expect(convert(1, 'gal', 'L')).toBeCloseTo(3.785411784, 12);
  });

  it('takes an RTI of 100 (ft·s)^½ as 55.2 (m·s)^½ (NFPA 72, annex B, from memory)', () => {
    expect(convert(100, '(ft s)1/2', '(m s)1/2')).toBeCloseTo(55.2, 1);
  });

  it('puts 100 000 Btu/ft² at 1135.65 MJ/m² (GNU units and mathjs agree)', () => {
    expect(convert(100_000, 'Btu/ft2', 'MJ/m2')).toBeCloseTo(1135.6527, 3);
  });

  it.each([
    [-40, -40],
    [0, 32],
    [100, 212],
    [943.9, 1731.02],
  ])('reads %d °C as %d °F', (celsius, fahrenheit) => {
    expect(convert(celsius, '°C', '°F')).toBeCloseTo(fahrenheit, 9);
  });

  it('takes a rise of 100 K as one of 180 °F, and never as a temperature', () => {
    expect(convert(100, 'K', '°F difference')).toBeCloseTo(180, 12);
    expect(() => convert(100, 'K', '°F')).toThrow(RangeError);
  });

  it('comes back from every unit of a dimension to within four units in the last place', () => {
    for (const from of UNIT_TABLE) {
      for (const to of UNIT_TABLE.filter((other) => other.dimension === from.dimension)) {
        for (const value of [1, 3.7, 1234.5678, 9.81e6]) {
          const back = convert(convert(value, from.key, to.key), to.key, from.key);
          expect(Math.abs(back - value), `${from.key} → ${to.key}`).toBeLessThanOrEqual(
            from.zero === to.zero ? 4 * Number.EPSILON * value : 1e-12 * value,
          );
        }
      }
    }
  });

  it('leaves a value in its own unit bit for bit', () => {
    expect(convert(0.1 + 0.2, 'm', 'm')).toBe(0.1 + 0.2);
  });

  it('refuses what measures something else, and what it does not know', () => {
    expect(() => convert(1, 'kg', 'm')).toThrow(/kg measures mass, m length/);
    expect(() => convert(1, 'furlong', 'm')).toThrow(/No unit is written “furlong”/);
  });

  it('has no spelling that means two units', () => {
    const seen = new Map<string, string>();
    for (const row of UNIT_TABLE) {
      for (const name of [row.key, row.symbol, ...row.aliases]) {
        const spelled = name.toLowerCase().replaceAll('²', '2').replaceAll('³', '3').replaceAll('·', ' ');
        expect(seen.get(spelled) ?? row.key, spelled).toBe(row.key);
        seen.set(spelled, row.key);
        expect(findUnit(name)?.key).toBe(row.key);
      }
    }
  });
});
