import { kindByKey } from '@embertally/shared/catalogue/kinds';
import { scaleKind } from '@embertally/shared/catalogue/scale-kind';
import { describe, expect, it } from 'vitest';

function kind(key: string) {
  const row = kindByKey(key);
  if (row === undefined) throw new Error(`The catalogue has no kind ${key}`);
  return row;
}

describe('scaleKind', () => {
  it('takes 12 m of bookshelf for 360 kg, twice the row’s 6 m', () => {
    const scaled = scaleKind(kind('bookshelves'), 12);
    expect(scaled.parts).toEqual([{ material: 'paper', mass_kg: 360 }]);
    expect(scaled).toMatchObject({ width_m: 2, depth_m: 0.3, height_m: 2.2, mass_low_kg: 300, mass_high_kg: 480 });
  });

  it('gives back the row itself for the row’s own amount', () => {
    const row = kind('foam-blocks');
    expect(scaleKind(row, row.measure.quantity)).toMatchObject({ parts: row.parts, width_m: row.width_m });
  });

  it.each([
    // 919 (1 + 2.14 h)(1 − 0.027 · 10) on 1.2 × 0.8 m, worked by hand
    [0.5, 1333.1],
    [1.5, 2711.4],
    [2.4, 3951.8],
  ])('a wooden pallet stack %d m high peaks at %d kW', (height, peak) => {
    const scaled = scaleKind(kind('pallet-stack'), height);
    expect(scaled.peak_kW).toBeCloseTo(peak, 0);
    expect(scaled.height_m).toBeCloseTo(height, 12);
    expect(scaled.width_m).toBe(1.2);
    expect(scaled.parts[0]?.mass_kg).toBeCloseTo((229 / 1.5) * height, 9);
  });

  it('agrees with the published value of a 2.4 m stack at 10 % moisture: 4116.5 kW/m²', () => {
    expect((scaleKind(kind('pallet-stack'), 2.4).peak_kW ?? 0) / (1.2 * 0.8)).toBeCloseTo(4116.5, 0);
  });

  it('knows no peak of a pallet stack outside 0.5 to 4.5 m', () => {
    expect(scaleKind(kind('pallet-stack'), 0.4).peak_kW).toBeNull();
    expect(scaleKind(kind('pallet-stack'), 4.6).peak_kW).toBeNull();
  });

  it('keeps the row’s own peak of a pallet stack in step with the formula', () => {
    expect(kind('pallet-stack').peak_kW).toBeCloseTo(scaleKind(kind('pallet-stack'), 1.5).peak_kW ?? 0, -1);
  });

  it('scales a peak in proportion, and leaves an unknown one unknown', () => {
    expect(scaleKind(kind('lithium-battery'), 0.5).peak_kW).toBe(150);
    expect(scaleKind(kind('solvent-paint-shelf'), 30).peak_kW).toBeNull();
  });

  it('refuses what is counted by the piece, and amounts that are none', () => {
    expect(() => scaleKind(kind('sofa'), 2)).toThrow(/counted by the piece/);
    for (const amount of [0, -1, Number.NaN, Number.POSITIVE_INFINITY]) {
      expect(() => scaleKind(kind('foam-blocks'), amount)).toThrow(/amount above 0/);
    }
  });
});
