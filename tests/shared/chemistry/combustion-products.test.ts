import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { combustionProducts } from '@embertally/shared/chemistry/combustion-products';
import { POLYMERS } from '@embertally/shared/chemistry/polymers';
import { netOfFormula } from '@embertally/shared/methods/chemistry/net-of-formula';
import { atoms } from '../../reference/atoms.ts';

describe('complete combustion', () => {
  it('loses no atom', () => {
    const count = fc.integer({ min: 0, max: 40 });
    fc.assert(
      fc.property(
        fc.record({ C: count, H: count, O: count, N: count, S: count, F: count, Cl: count, Br: count }),
        (fuel) => {
          const burnt = combustionProducts(fuel);
          if (!burnt.ok) {
            const short = fuel.F + fuel.Cl + fuel.Br > fuel.H;
            expect(short || 2 * (fuel.C + fuel.S) + (fuel.H - fuel.F - fuel.Cl - fuel.Br) / 2 <= fuel.O).toBe(true);
            return;
          }
          const { O2, CO2, H2O, N2, SO2, HF, HCl, HBr } = burnt.products;
          expect(CO2).toBe(fuel.C);
          expect(2 * H2O + HF + HCl + HBr).toBeCloseTo(fuel.H, 9);
          expect(2 * CO2 + H2O + 2 * SO2).toBeCloseTo(fuel.O + 2 * O2, 9);
          expect(2 * N2).toBe(fuel.N);
          expect([SO2, HF, HCl, HBr]).toEqual([fuel.S, fuel.F, fuel.Cl, fuel.Br]);
          expect(O2).toBeGreaterThan(0);
        },
      ),
    );
  });

  it('says that hydrogen runs out instead of counting water below nothing', () => {
    expect(combustionProducts(atoms({ C: 2, F: 4 }))).toMatchObject({ ok: false });
    expect(combustionProducts(atoms({ C: 1, H: 1, Cl: 3 }))).toMatchObject({ ok: false });
  });
});

describe('polymers', () => {
  it.each(POLYMERS.map((polymer) => [polymer.name, polymer] as const))(
    '%s: net below gross, heat per kg of oxygen as fuels have it',
    (_name, { unit, gross, grossLiterature }) => {
      for (const heat of [gross, grossLiterature]) {
        const { net, perOxygen } = netOfFormula.run({ ...atoms(unit), gross: heat });
        expect(net).toBeLessThan(heat);
        expect(perOxygen).toBeGreaterThan(11);
        expect(perOxygen).toBeLessThan(15);
      }
    },
  );
});
