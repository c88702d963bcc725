import { describe, expect, it } from 'vitest';
import type { OwnMaterialLookup } from '@embertally/shared/materials/material-lookup';
import { derived, faultsOf } from './derived.ts';

const OWN = '5b0c5a52-6a1e-4a57-9c55-0d3e6f0f9a11';
const lookup: OwnMaterialLookup = (material, version) =>
  material === OWN && version === 2
    ? {
        label: 'Painted canvas',
        net_MJ_kg: 17,
        low_MJ_kg: 16,
        high_MJ_kg: 18,
        gross_MJ_kg: null,
        cellulosic: true,
        moisture_pct_wet: 6,
        radiative_fraction: 0.3,
      }
    : null;
const composition = (parts: readonly (readonly [string, number, number?])[], inert_pct?: number) => ({
  way: 'composition',
  parts: parts.map(([material, mass_pct, version = null as never]) => ({ material, mass_pct, version })),
  ...(inert_pct === undefined ? {} : { inert_pct }),
});

describe('a material composed of others', () => {
  it('adds heats up by mass', () => {
    // Polyethylene 43.4 and cotton 16.3 MJ/kg net: 0.6 · 43.4 + 0.4 · 16.3.
    const material = derived(
      composition([
        ['polyethylene', 60],
        ['cotton', 40],
      ]),
    );
    expect(material.net_MJ_kg).toBeCloseTo(32.56, 9);
    expect(material.low_MJ_kg).toBeLessThan(32.56);
    expect(material.cellulosic).toBe(false);
    expect(
      derived(
        composition([
          ['polyethylene', 40],
          ['cotton', 60],
        ]),
      ).combustion_factor,
    ).toBe(0.8);
  });

  it('of one is that one', () => {
    const material = derived(composition([['polystyrene', 100]]));
    expect(material).toMatchObject({ net_MJ_kg: 39.8, low_MJ_kg: 39, high_MJ_kg: 42 });
  });

  it('what does not burn counts with nothing: 30 % glass in polyester', () => {
    const neat = derived(composition([['polyester-resin', 100]])).net_MJ_kg;
    expect(derived(composition([['polyester-resin', 70]], 30)).net_MJ_kg).toBeCloseTo(0.7 * neat, 9);
  });

  it('takes approved versions of own materials, and no others', () => {
    const material = derived(
      composition([
        [OWN, 50, 2],
        ['polyethylene', 50],
      ]),
      lookup,
    );
    expect(material.net_MJ_kg).toBeCloseTo(30.2, 9);
    expect(material.gross_MJ_kg).toBeNull();
    expect(
      faultsOf(
        composition([
          [OWN, 50, 1],
          ['polyethylene', 50],
        ]),
        lookup,
      ),
    ).toMatchObject([{ pointer: '/parts/0/material', code: 'unknown_material' }]);
  });

  it('allows half a percent, and says the sum beyond it', () => {
    expect(
      derived(
        composition([
          ['polyethylene', 60.4],
          ['cotton', 40],
        ]),
      ).net_MJ_kg,
    ).toBeCloseTo(32.6, 1);
    const [fault] = faultsOf(
      composition([
        ['polyethylene', 60],
        ['cotton', 30],
      ]),
    );
    expect(fault).toMatchObject({ pointer: '/parts', code: 'sum' });
    expect(fault?.message).toMatch(/90 %/);
  });

  it('refuses unknown materials and one listed twice', () => {
    const codes = faultsOf(
      composition([
        ['moonstone', 50],
        ['cotton', 25],
        ['cotton', 25],
      ]),
    ).map(({ code }) => code);
    expect(codes).toEqual(['unknown_material', 'twice']);
    expect(faultsOf(composition([]))).toMatchObject([{ pointer: '/parts', code: 'too_small' }]);
  });
});
