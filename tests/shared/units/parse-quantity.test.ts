import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { parseQuantity, type QuantityField } from '@embertally/shared/units/parse-quantity';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

const width: QuantityField = { unit: 'm', system: 'SI', name: 'Width' };
const widthUS: QuantityField = { ...width, system: 'US' };

function value(text: string, field: QuantityField = width): number {
  const parsed = parseQuantity(text, field);
  if (!parsed.ok) throw new Error(`${text}: ${parsed.message}`);
  return parsed.value;
}

function refusal(text: string, field: QuantityField = width) {
  const parsed = parseQuantity(text, field);
  if (parsed.ok) throw new Error(`${text} was taken for ${parsed.value}`);
  return parsed;
}

describe('parseQuantity', () => {
  it.each([
    ['2.4', 2.4],
    ['2,4', 2.4],
    ['12.5 m', 12.5],
    ['2400mm', 2.4],
    ['2 400 mm', 2.4],
    ['240 cm', 2.4],
    ['7 ft 10 in', 94 * 0.0254],
    ['7ft 10in', 94 * 0.0254],
    ['7ft10', 94 * 0.0254],
    ['7\'10"', 94 * 0.0254],
    ['5\' 6 1/2"', 66.5 * 0.0254],
    ['5′ 6½″', 66.5 * 0.0254],
    ["5' 6", 66 * 0.0254],
    ['5 feet', 1.524],
    ['1 m 20 cm', 1.2],
    ['-1 ft 6 in', -18 * 0.0254],
    ['1 200', 1200],
    ['6 1/2', 6.5],
  ])('reads %s as a length', (text, metres) => {
    expect(value(text)).toBeCloseTo(metres, 12);
  });

  it('takes a plain number in the unit the person reads', () => {
    expect(value('10', widthUS)).toBeCloseTo(3.048, 12);
    expect(value('10 m', widthUS)).toBe(10);
    expect(value('212', { unit: '°C', system: 'US', name: 'Activation' })).toBeCloseTo(100, 10);
  });

  it.each([
    ['900', 'MJ/m2', 'SI', 900],
    ['100 000 Btu/ft2', 'MJ/m2', 'SI', 1135.6527],
    ['2.5 MW', 'kW', 'SI', 2500],
    ['12 lb 8 oz', 'kg', 'SI', 12.5 * 0.45359237],
    ['20 m2', 'm2', 'SI', 20],
    ['20 m²', 'm2', 'US', 20],
    ['200 sq ft', 'm2', 'SI', 200 * 0.09290304],
    ['5 gal', 'L', 'SI', 18.92705892],
    ['1 h 20 min', 'min', 'SI', 80],
    ['90 s', 'min', 'SI', 1.5],
    ['1.2 t', 'kg', 'SI', 1200],
    ['155 °F', '°C', 'SI', 68.3333333],
    ['1e3 kg', 'kg', 'SI', 1000],
  ] as const)('reads %s into %s', (text, unit, system, expected) => {
    expect(value(text, { unit, system, name: 'Amount' })).toBeCloseTo(expected, 4);
  });

  it('asks about 1,234 and offers both readings', () => {
    const refused = refusal('1,234 mm');
    expect(refused.code).toBe('ambiguous');
    expect(refused.message).toBe(
      'Width: does “1,234” mean 1234 or 1.234? Enter it without the separator, or with all decimals',
    );
    expect(refused.choices).toEqual([
      { text: '1234 mm', decimal: 'point', value: 1.234 },
      { text: '1.234 mm', decimal: 'comma', value: expect.closeTo(0.001234, 12) as number },
    ]);
    for (const choice of refused.choices ?? []) {
      expect(value('1,234 mm', { ...width, decimal: choice.decimal })).toBeCloseTo(choice.value, 12);
    }
  });

  it.each([
    ['', 'empty', 'Enter the width'],
    ['   ', 'empty', 'Enter the width'],
    ['wide', 'not a number', 'Width must be a number, like 12.5 or 12.5 m'],
    ['12..5', 'not a number', 'Width must be a number, like 12.5 or 12.5 m'],
    ['4 in 2 ft', 'not a number', 'Width must be a number, like 12.5 or 12.5 m'],
    ['3 furlong', 'unknown unit', 'Width: “furlong” is not a unit known here. Enter a number, like 12.5 m'],
    ['3 kg', 'wrong unit', 'Width is measured in m, like 12.5 m; kg is a unit of mass'],
    ['12 m 5', 'not a number', 'Width must be one number, like 12.5'],
  ])('refuses “%s” and says how to put it right', (text, code, message) => {
    expect(refusal(text)).toMatchObject({ ok: false, code, message });
  });

  it.each(['NaN', 'Infinity', '1e999', '--2', '5 ft -6 in', '1; drop', '9'.repeat(400), '1 '.repeat(5000)])(
    'refuses “%.20s”',
    (text) => {
      expect(refusal(text).message).toMatch(/^Width/);
    },
  );

  it('keeps to the bounds of the field, in the person’s unit', () => {
    const height: QuantityField = { unit: 'm', system: 'SI', name: 'Height', minimum: 0.5, maximum: 100 };
    expect(value('0.5', height)).toBe(0.5);
    expect(value('100', height)).toBe(100);
    expect(refusal('0.49', height)).toMatchObject({
      code: 'out of range',
      message: 'Height must be between 0.5 m and 100 m',
    });
    expect(refusal('500', { ...height, system: 'US', minimum: 0.3048, maximum: 3.048 }).message).toBe(
      'Height must be between 1 ft and 10 ft',
    );
    expect(refusal('-1', { unit: 'kg', system: 'SI', name: 'Mass', minimum: 0 }).message).toBe(
      'Mass must be 0 kg or more',
    );
    expect(refusal('11', { unit: 'kg', system: 'SI', name: 'Mass', maximum: 10 }).message).toBe(
      'Mass must be 10 kg or less',
    );
  });

  it('reads back every quantity that was shown as entered, to its seven figures', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.001, max: 99_999, noNaN: true }),
        fc.constantFrom('m', 'kg', 'MJ/m2', 'kW', '°C', 'm2', 'MJ/kg'),
        fc.constantFrom('SI' as const, 'US' as const),
        (amount, unit, system) => {
          const shown = formatQuantity(amount, unit, system, { figures: 'as entered' });
          const back = value(`${shown.text} ${shown.unit}`, { unit, system, name: 'Amount' });
          expect(Math.abs(back - amount)).toBeLessThan(1e-6 * (amount + 20));
        },
      ),
    );
  });

  it('never throws and never returns a number that is none, whatever is typed', () => {
    fc.assert(
      fc.property(fc.string({ unit: fc.constantFrom(...'0123456789., /\'"ftinm²-−e½kg') }), (text) => {
        const parsed = parseQuantity(text, width);
        if (parsed.ok) expect(Number.isFinite(parsed.value)).toBe(true);
        else expect(parsed.message).not.toBe('');
      }),
      { numRuns: 3000 },
    );
  });
});
