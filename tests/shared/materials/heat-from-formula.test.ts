import { describe, expect, it } from 'vitest';
import { derived, faultsOf } from './derived.ts';

/** Net and gross, MJ/kg: CRC enthalpies of formation; GRI-Mech 3.0 with the water equation of state for the gases. */
const FUELS = [
  ['methane', 'CH4', -74.6, 'gas', 50.03, 55.51],
  ['propane', 'C3H8', -103.8, 'gas', 46.35, 50.34],
  ['hydrogen', 'H2', 0, 'gas', 119.95, 141.78],
  ['acetylene', 'C2H2', 227.4, 'gas', 48.25, 49.94],
  ['ethanol', 'C2H5OH', -277.6, 'liquid', 26.81, 29.67],
  ['n-octane', 'CH3(CH2)6CH3', -250.1, 'liquid', 44.42, 47.89],
  ['glucose', 'C6H12O6', -1273.3, 'solid', 14.09, 15.56],
  ['benzoic acid', 'C6H5COOH', -385.2, 'solid', 25.34, 26.42],
  ['urea', 'CO(NH2)2', -333.1, 'solid', 9.06, 10.52],
  ['carbon disulfide', 'CS2', 89, 'liquid', 14.14, 14.14],
  ['vinyl chloride', 'C2H3Cl', 22.1, 'gas', 18.29, 19.0],
] as const;

describe('a material from its formula', () => {
  it.each(FUELS)('%s', (_name, formula, formation_kJ_mol, phase, net, gross) => {
    const material = derived({ way: 'formula', formula, formation_kJ_mol, phase });
    expect(material.net_MJ_kg).toBeCloseTo(net, 1);
    expect(material.gross_MJ_kg).toBeCloseTo(gross, 1);
    expect(material.low_MJ_kg).toBeCloseTo(net * 0.99, 1);
    expect(material.high_MJ_kg).toBeCloseTo(net * 1.01, 1);
    expect(['plausible', 'genuine-exception']).toContain(material.basis?.finding);
    expect(material.basis?.proposal).toBeNull();
  });

  it('tells oxygen and air, and opens the working of each number', () => {
    const material = derived({ way: 'formula', formula: 'CH4', formation_kJ_mol: -74.6, phase: 'gas' });
    expect(material.oxygen_kg_kg).toBeCloseTo(3.989, 3);
    const air = material.workings.find(({ symbol }) => symbol === 'r_air');
    expect(air?.value).toBeCloseTo(17.24, 2);
    for (const working of material.workings) {
      expect(working.equation).toBeTruthy();
      expect(working.sources?.length).toBeGreaterThan(0);
      expect(working.steps?.length).toBeGreaterThan(0);
    }
    expect(material.methods).toContain('chemistry.heat-from-formation@1');
  });

  it('says what cannot be read, at its field', () => {
    const formula = (text: string, formation_kJ_mol = 0) =>
      faultsOf({ way: 'formula', formula: text, formation_kJ_mol, phase: 'solid' });
    expect(formula('Xy2')).toMatchObject([{ pointer: '/formula', code: 'formula' }]);
    expect(formula('2 C8H18')[0]?.message).toMatch(/moles/);
    expect(formula('CF4')[0]?.message).toMatch(/Hydrogen runs out/);
    expect(formula('CO2')[0]?.message).toMatch(/takes up no oxygen/);
    expect(formula('')[0]).toMatchObject({ pointer: '/formula', message: 'Enter the formula.' });
  });

  it('sees an enthalpy of formation with the wrong sign, and proposes no factor for it', () => {
    expect(faultsOf({ way: 'formula', formula: 'C8H18', formation_kJ_mol: -10_149, phase: 'liquid' })[0]).toMatchObject(
      { pointer: '/formation_kJ_mol', code: 'no_heat' },
    );
    const wrong = derived({ way: 'formula', formula: 'C6H12O6', formation_kJ_mol: 1273.3, phase: 'solid' });
    expect(wrong.basis).toMatchObject({ finding: 'implausible', proposal: null });
    expect(wrong.basis?.text).toMatch(/sign/);
    expect(wrong.warnings.map(({ code }) => code)).toContain('BASIS');
  });
});
