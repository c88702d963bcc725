import { displayUnit } from '@embertally/shared/units/display-unit';
import { formatNumber } from '@embertally/shared/units/format-number';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { describe, expect, it } from 'vitest';

/** The thin space between groups of three digits. */
const T = '\u202f';

describe('formatNumber', () => {
  it.each([
    [512.4, '512'],
    [13_400, `13${T}400`],
    [1234.5, `1${T}230`],
    [999.6, `1${T}000`],
    [0.02213, '0.0221'],
    [0.8, '0.800'],
    [2.5, '2.50'],
    [-3.14159, '−3.14'],
    [0, '0'],
    [1_234_567, `1${T}230${T}000`],
    [0.00001234, '1.23 × 10⁻⁵'],
    [0.00012345, '0.000123'],
    [1.5e20, '1.50 × 10²⁰'],
    [Number.NaN, '–'],
    [Number.POSITIVE_INFINITY, '–'],
  ])('%d is written %s', (value, text) => {
    expect(formatNumber(value, 3)).toBe(text);
  });
});

describe('formatQuantity', () => {
  it.each([
    [512.4, 'MJ/m2', '512', 'MJ/m²'],
    [13_400, 'MJ', `13${T}400`, 'MJ'],
    [7.4361, 'm^5/2', '7.44', 'm^5/2'],
    [218.4, 'K', '218', 'K'],
    [944.14, '°C', '944', '°C'],
    [14.11, 'min', '14.1', 'min'],
    [96, 'm2', '96.0', 'm²'],
    [12, 'choices', '12.0', 'choices'],
  ])('writes %d %s in SI', (value, unit, text, symbol) => {
    expect(formatQuantity(value, unit, 'SI')).toEqual({ text, unit: symbol });
  });

  it.each([
    // 512.4 MJ/m² × 88.0551 Btu/ft² per MJ/m² = 45 119
    [512.4, 'MJ/m2', `45${T}100`, 'Btu/ft²'],
    [1000, 'kW', '948', 'Btu/s'],
    [2.4, 'm', '7.87', 'ft'],
    [96, 'm2', `1${T}030`, 'ft²'],
    [100, 'kg', '220', 'lb'],
    [944.14, '°C', `1${T}730`, '°F'],
    [218.4, 'K', '393', '°F difference'],
    [13_400, 'MJ', '12.7', 'million Btu'],
    [20, 'kW/m2', '1.76', 'Btu/(s·ft²)'],
    [16.8, 'MJ/kg', `7${T}220`, 'Btu/lb'],
    [14.11, 'min', '14.1', 'min'],
  ])('writes %d %s in US customary', (value, unit, text, symbol) => {
    expect(formatQuantity(value, unit, 'US')).toEqual({ text, unit: symbol });
  });

  it.each([
    [45.21, '45.2', 's'],
    [59.7, '1 min 0', 's'],
    [474.34, '7 min 54', 's'],
    [5890.6, '1 h 38', 'min'],
    [7199.9, '2 h 0', 'min'],
    [0, '0', 's'],
    [-90, '−1 min 30', 's'],
  ])('writes %d seconds as people say them', (value, text, unit) => {
    expect(formatQuantity(value, 's', 'SI')).toEqual({ text, unit });
    expect(formatQuantity(value, 's', 'US')).toEqual({ text, unit });
  });

  it('gives back what was entered, without noise from a conversion', () => {
    expect(formatQuantity(22.35, 'kg', 'SI', { figures: 'as entered' }).text).toBe('22.35');
    expect(formatQuantity(1200, 'kg', 'SI', { figures: 'as entered' }).text).toBe(`1${T}200`);
    expect(formatQuantity(12 * 0.45359237, 'kg', 'US', { figures: 'as entered' })).toEqual({ text: '12', unit: 'lb' });
    expect(formatQuantity(0.1 + 0.2, 'm', 'SI', { figures: 'as entered' }).text).toBe('0.3');
  });

  it('never shows a number that is none', () => {
    expect(formatQuantity(Number.NaN, 's', 'SI')).toEqual({ text: '–', unit: 's' });
    expect(formatQuantity(Number.NaN, 'kW', 'US')).toEqual({ text: '–', unit: 'Btu/s' });
  });
});

describe('displayUnit', () => {
  it('is the kept unit in SI, the customary one in US, and nothing for a word that is no unit', () => {
    expect(displayUnit('MJ/m2', 'SI')?.symbol).toBe('MJ/m²');
    expect(displayUnit('MJ/m²', 'US')?.symbol).toBe('Btu/ft²');
    expect(displayUnit('min', 'US')?.symbol).toBe('min');
    expect(displayUnit('choices', 'US')).toBeUndefined();
  });
});
