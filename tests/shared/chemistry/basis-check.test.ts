import { describe, expect, it } from 'vitest';
import { checkBasis } from '@embertally/shared/chemistry/basis-check';
import { atoms } from '../../reference/atoms.ts';

/** Net heats, kJ/mol, from enthalpies of formation of the CRC Handbook. */
const FUELS = [
  ['methane', atoms({ C: 1, H: 4 }), 802.6],
  ['octane', atoms({ C: 8, H: 18 }), 5074.4],
  ['benzene', atoms({ C: 6, H: 6 }), 3135.6],
  ['ethanol', atoms({ C: 2, H: 6, O: 1 }), 1234.9],
  ['sucrose', atoms({ C: 12, H: 22, O: 11 }), 5156.1],
  ['urea', atoms({ C: 1, H: 4, N: 2, O: 1 }), 544.1],
  ['vinyl chloride', atoms({ C: 2, H: 3, Cl: 1 }), 1143.3],
  ['acetylene', atoms({ C: 2, H: 2 }), 1256.2],
  ['hydrogen', atoms({ H: 2 }), 241.8],
  ['carbon monoxide', atoms({ C: 1, O: 1 }), 283],
] as const;

describe('the basis of a claimed heat', () => {
  it.each(FUELS)('%s stands as it is', (_name, fuel, net) => {
    expect(['plausible', 'genuine-exception']).toContain(checkBasis(fuel, net).finding);
    expect(checkBasis(fuel, net).factor).toBeNull();
  });

  it.each(FUELS.filter(([name]) => name !== 'urea'))(
    '%s for two moles or half a mole is found, with the factor back',
    (_name, fuel, net) => {
      for (const slip of [2, 3, 1 / 2, 1 / 3]) {
        const { finding, factor } = checkBasis(fuel, net * slip);
        expect(finding).toBe('wrong-mole-basis');
        expect(net * slip * (factor ?? 0)).toBeCloseTo(net, 6);
      }
    },
  );

  it('a slip in urea, which stands at the edge of the band, is noticed but not explained', () => {
    const urea = atoms({ C: 1, H: 4, N: 2, O: 1 });
    for (const slip of [2, 1 / 2]) expect(checkBasis(urea, 544.1 * slip).finding).not.toBe('plausible');
  });

  it('hydrogen’s gross heat is told from its net heat, and the correction is the heat in the water', () => {
    const { finding, factor } = checkBasis(atoms({ H: 2 }), 285.8);
    expect(finding).toBe('gross-for-net');
    expect(285.8 * (factor ?? 0)).toBeCloseTo(241.8, 1);
  });

  it('nitromethane carries its own oxygen: its high value is no doubling', () => {
    expect(checkBasis(atoms({ C: 1, H: 3, N: 1, O: 2 }), 643.6)).toMatchObject({ finding: 'own-oxygen', factor: null });
  });

  it('says so when no simple mistake explains a value, and what it cannot judge', () => {
    expect(checkBasis(atoms({ C: 8, H: 18 }), 5074.4 * 0.7)).toMatchObject({ finding: 'implausible', factor: null });
    expect(checkBasis(atoms({ C: 8, H: 18 }), -5074.4)).toMatchObject({ finding: 'implausible', factor: null });
    expect(checkBasis(atoms({ C: 1, F: 4 }), 100)).toMatchObject({ finding: 'not-covered', perOxygen: null });
    expect(checkBasis(atoms({ C: 1, O: 2 }), 100)).toMatchObject({ finding: 'not-covered', perOxygen: null });
    expect(checkBasis(atoms({}), 100)).toMatchObject({ finding: 'not-covered', perOxygen: null });
  });
});
