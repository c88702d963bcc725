import { describe, expect, it } from 'vitest';
import { derived, faultsOf } from './derived.ts';

const OCTANE = '2 C8H18 + 25 O2 -> 16 CO2 + 18 H2O(g)';
const octane = (heat: object, more: object = {}) => ({
  way: 'equation',
  formula: 'C8H18',
  water: 'vapour',
  heat,
  ...more,
});

describe('a material from a thermochemical equation', () => {
  it('divides by the moles the equation is written for', () => {
    const material = derived(octane({ as: 'equation', moles: 2, enthalpy_kJ: -10_149, text: OCTANE }));
    expect(material.net_MJ_kg).toBeCloseTo(44.42, 1);
    expect(material.gross_MJ_kg).toBeCloseTo(47.89, 1);
    expect(material.basis?.finding).toBe('plausible');
  });

  /** Textbook values from memory, water liquid, kJ: gross and net against the CRC table. */
  it.each([
    ['C6H12O6', 1, -2805, 'C6H12O6 + 6 O2 → 6 CO2 + 6 H2O(l)', 15.57, 14.1],
    ['CH4', 1, -890.4, 'CH4 + 2 O2 = CO2 + 2 H2O(l)', 55.5, 50.0],
    ['C2H6', 2, -3119.4, '2 C2H6 + 7 O2 -> 4 CO2 + 6 H2O(l)', 51.9, 47.5],
    ['C2H2', 2, -2599, '2 C2H2 + 5 O2 -> 4 CO2 + 2 H2O(l)', 49.9, 48.2],
  ])('%s for %d mol', (formula, moles, enthalpy_kJ, text, gross, net) => {
    const material = derived({
      way: 'equation',
      formula,
      water: 'liquid',
      heat: { as: 'equation', moles, enthalpy_kJ, text },
    });
    expect(material.gross_MJ_kg).toBeCloseTo(gross, 1);
    expect(Math.abs(material.net_MJ_kg - net)).toBeLessThan(0.1);
  });

  it('finds the heat of two moles taken for one, and proposes without applying', () => {
    const material = derived(octane({ as: 'mole', heat_kJ_mol: 10_149 }));
    expect(material.net_MJ_kg).toBeCloseTo(88.85, 1);
    expect(material.basis?.finding).toBe('wrong-mole-basis');
    expect(material.basis?.proposal?.factor).toBe(0.5);
    expect(material.basis?.proposal?.net_MJ_kg).toBeCloseTo(44.42, 1);
    expect(material.basis?.proposal?.text).toBe('Multiplied by 0.5 it would be 44.4 MJ/kg.');
    expect(material.basis?.accepted).toBeNull();
  });

  it('finds the heat that was divided twice', () => {
    const material = derived(octane({ as: 'mole', heat_kJ_mol: 2537.2 }));
    expect(material.basis?.proposal?.factor).toBe(2);
    expect(material.basis?.proposal?.net_MJ_kg).toBeCloseTo(44.42, 1);
  });

  it('applies a proposal that a person took over, and keeps what was stated', () => {
    const accepted = { finding: 'wrong-mole-basis', factor: 0.5 };
    const material = derived(octane({ as: 'mole', heat_kJ_mol: 10_149 }, { accepted }));
    expect(material.net_MJ_kg).toBeCloseTo(44.42, 1);
    expect(material.gross_MJ_kg).toBeCloseTo(47.89, 1);
    expect(material.basis?.proposal).toBeNull();
    expect(material.basis?.accepted?.stated_net_MJ_kg).toBeCloseTo(88.85, 1);
    expect(material.methods).toContain('chemistry.basis-correction@1');
    expect(material.warnings.map(({ code }) => code)).toEqual(['BASIS_CORRECTED']);
  });

  it('corrects a doubled gross heat as gross: the heat in the water is not halved', () => {
    const stated = octane({ as: 'mole', heat_kJ_mol: 10_940.8 }, { water: 'liquid' });
    const factor = derived(stated).basis?.proposal?.factor;
    const material = derived({ ...stated, accepted: { finding: 'wrong-mole-basis', factor } });
    expect(material.gross_MJ_kg).toBeCloseTo(47.89, 1);
    expect(material.net_MJ_kg).toBeCloseTo(44.42, 1);
  });

  it('refuses a correction that is no longer proposed, so nothing is corrected twice', () => {
    const accepted = { finding: 'wrong-mole-basis', factor: 0.5 };
    expect(faultsOf(octane({ as: 'equation', moles: 2, enthalpy_kJ: -10_149 }, { accepted }))).toMatchObject([
      { pointer: '/accepted', code: 'not_proposed' },
    ]);
  });

  it('tells hydrogen’s gross heat from its net heat', () => {
    const stated = { way: 'equation', formula: 'H2', water: 'vapour', heat: { as: 'mole', heat_kJ_mol: 285.83 } };
    const { basis } = derived(stated);
    expect(basis?.finding).toBe('gross-for-net');
    expect(basis?.proposal?.net_MJ_kg).toBeCloseTo(119.95, 1);
    const accepted = { finding: 'gross-for-net', factor: basis?.proposal?.factor };
    const taken = derived({ ...stated, accepted });
    expect(taken.net_MJ_kg).toBeCloseTo(119.95, 1);
    expect(taken.gross_MJ_kg).toBeCloseTo(141.8, 1);
  });

  it('leaves genuine exceptions alone', () => {
    const carbonMonoxide = derived({
      way: 'equation',
      formula: 'CO',
      water: 'vapour',
      heat: { as: 'mole', heat_kJ_mol: 283 },
    });
    expect(carbonMonoxide.basis).toMatchObject({ finding: 'genuine-exception', proposal: null });
    expect(carbonMonoxide.warnings).toEqual([]);
  });

  it('says what does not fit between equation, formula, moles, sign and water', () => {
    const faults = (heat: object, more: object = {}) =>
      faultsOf(octane(heat, more)).map(({ pointer, code }) => `${pointer} ${code}`);
    expect(faults({ as: 'equation', moles: 2, enthalpy_kJ: 10_149 })).toEqual(['/heat/enthalpy_kJ sign']);
    expect(faults({ as: 'equation', moles: 2, enthalpy_kJ: 0 })).toEqual(['/heat/enthalpy_kJ sign']);
    expect(faults({ as: 'equation', moles: 1, enthalpy_kJ: -10_149, text: OCTANE })).toEqual([
      '/heat/moles other_moles',
    ]);
    expect(
      faults({ as: 'equation', moles: 2, enthalpy_kJ: -10_149, text: OCTANE }, { water: 'liquid', formula: 'C7H16' }),
    ).toEqual(['/formula other_fuel', '/water other_water']);
    expect(
      faults({ as: 'equation', moles: 2, enthalpy_kJ: -10_149, text: '2 C8H18 + 24 O2 -> 16 CO2 + 18 H2O' }),
    ).toEqual(['/heat/text equation']);
    expect(faults({ as: 'mole', heat_kJ_mol: 100 }, { water: 'liquid' })).toEqual(['/heat/heat_kJ_mol not_possible']);
    expect(faults({ as: 'equation', moles: 0, enthalpy_kJ: -1 })).toEqual(['/heat/moles too_small']);
  });
});
