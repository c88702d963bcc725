import { MATERIALS, materialByKey } from '@embertally/shared/catalogue/materials';
import { describe, expect, it } from 'vitest';

/**
 * Net and gross heats worked out here from enthalpies of formation at 298.15 K (CRC Handbook of Chemistry and Physics as
 * in the open data set chemicals 1.5.2; glucose from memory of the CRC Handbook; melamine from the NIST Chemistry
 * WebBook), kJ/mol, in the phase the fuel is kept in.
 */
const FORMATION: Readonly<Record<string, readonly [formula: string, enthalpy_kJ_mol: number]>> = {
  methane: ['CH4', -74.6],
  ethane: ['C2H6', -84.0],
  propane: ['C3H8', -103.8],
  butane: ['C4H10', -125.7],
  isobutane: ['C4H10', -134.2],
  pentane: ['C5H12', -173.5],
  hexane: ['C6H14', -198.7],
  heptane: ['C7H16', -224.2],
  octane: ['C8H18', -250.1],
  isooctane: ['C8H18', -259.2],
  decane: ['C10H22', -300.9],
  dodecane: ['C12H26', -350.9],
  ethylene: ['C2H4', 52.4],
  propylene: ['C3H6', 20.0],
  acetylene: ['C2H2', 227.4],
  butadiene: ['C4H6', 110.0],
  benzene: ['C6H6', 49.1],
  toluene: ['C7H8', 12.4],
  xylene: ['C8H10', -24.4],
  styrene: ['C8H8', 103.8],
  cyclohexane: ['C6H12', -156.4],
  naphthalene: ['C10H8', 78.5],
  methanol: ['CH4O', -239.2],
  ethanol: ['C2H6O', -277.6],
  isopropanol: ['C3H8O', -318.1],
  butanol: ['C4H10O', -327.3],
  'ethylene-glycol': ['C2H6O2', -460.0],
  glycerol: ['C3H8O3', -669.6],
  acetone: ['C3H6O', -248.4],
  butanone: ['C4H8O', -273.3],
  'diethyl-ether': ['C4H10O', -279.5],
  'dimethyl-ether': ['C2H6O', -184.1],
  mtbe: ['C5H12O', -313.6],
  acetaldehyde: ['C2H4O', -192.2],
  'formic-acid': ['CH2O2', -425.0],
  'acetic-acid': ['C2H4O2', -484.3],
  'ethyl-acetate': ['C4H8O2', -479.3],
  'benzoic-acid': ['C7H6O2', -385.2],
  phenol: ['C6H6O', -165.1],
  glucose: ['C6H12O6', -1273.3],
  sugar: ['C12H22O11', -2226.1],
  'stearic-acid': ['C18H36O2', -947.7],
  urea: ['CH4N2O', -333.1],
  melamine: ['C3H6N6', -75.76],
  caprolactam: ['C6H11NO', -329.4],
  aniline: ['C6H7N', 31.6],
  acrylonitrile: ['C3H3N', 147.1],
  ammonia: ['NH3', -45.9],
  hydrogen: ['H2', 0],
  'carbon-monoxide': ['CO', -110.53],
  graphite: ['C', 0],
  sulfur: ['S', 0],
  'hydrogen-sulfide': ['H2S', -20.6],
  'carbon-disulfide': ['CS2', 89.0],
  nitromethane: ['CH3NO2', -112.6],
  'diethyl-carbonate': ['C5H10O3', -681.5],
};

const ATOMIC: Readonly<Record<string, number>> = { H: 1.008, C: 12.011, N: 14.007, O: 15.999, S: 32.06 };
const CO2 = -393.51;
const WATER_VAPOUR = -241.826;
const WATER_LIQUID = -285.83;
const SO2 = -296.81;

function heats_MJ_kg(formula: string, enthalpy_kJ_mol: number): { net: number; gross: number; perOxygen: number } {
  const atoms: Record<string, number> = {};
  for (const [, element = '', count = ''] of formula.matchAll(/([A-Z][a-z]?)(\d*)/g)) {
    atoms[element] = (atoms[element] ?? 0) + Number(count === '' ? 1 : count);
  }
  const of = (element: string) => atoms[element] ?? 0;
  const molar = Object.entries(atoms).reduce((sum, [element, n]) => sum + n * (ATOMIC[element] ?? Number.NaN), 0);
  const products = of('C') * CO2 + of('S') * SO2;
  const oxygen = of('C') + of('S') + of('H') / 4 - of('O') / 2;
  const net = enthalpy_kJ_mol - products - (of('H') / 2) * WATER_VAPOUR;
  const gross = enthalpy_kJ_mol - products - (of('H') / 2) * WATER_LIQUID;
  return { net: net / molar, gross: gross / molar, perOxygen: net / (31.998 * oxygen) };
}

describe('heats of pure substances', () => {
  it('covers every material that carries a formula', () => {
    const withFormula = MATERIALS.filter((row) => row.formula !== null).map((row) => row.key);
    expect(withFormula.toSorted()).toEqual(Object.keys(FORMATION).toSorted());
  });

  it.each(Object.entries(FORMATION))('%s follows from its enthalpy of formation', (key, [formula, enthalpy]) => {
    const row = materialByKey(key);
    const { net, gross } = heats_MJ_kg(formula, enthalpy);
    expect(row?.formula).toBe(formula);
    expect(Math.abs((row?.net_heat_MJ_kg ?? 0) - net), 'net').toBeLessThan(0.06);
    expect(Math.abs((row?.gross_heat_MJ_kg ?? 0) - gross), 'gross').toBeLessThan(0.06);
    expect(row?.low_MJ_kg).toBeLessThanOrEqual(net + 0.05);
    expect(row?.high_MJ_kg).toBeGreaterThanOrEqual(net - 0.05);
  });

  it('lies on 11 to 15 MJ per kg of oxygen, with the substances known to stand off it named', () => {
    const off = Object.entries(FORMATION)
      .filter(([, [formula, enthalpy]]) => {
        const { perOxygen } = heats_MJ_kg(formula, enthalpy);
        return perOxygen < 11 || perOxygen > 15;
      })
      .map(([key]) => key);
    expect(off.toSorted()).toEqual(
      ['acetylene', 'carbon-monoxide', 'hydrogen', 'hydrogen-sulfide', 'nitromethane', 'sulfur'].toSorted(),
    );
  });

  it('takes metals by the enthalpy of formation of their oxides (CRC Handbook, from memory)', () => {
    expect(materialByKey('magnesium')?.net_heat_MJ_kg).toBeCloseTo(601.6 / 24.305, 1);
    expect(materialByKey('aluminium-powder')?.net_heat_MJ_kg).toBeCloseTo(1675.7 / 2 / 26.982, 1);
  });

  it('gives methane the heat that the NASA polynomials of GRI-Mech 3.0 give', () => {
    // 393.508 + 2 × 241.825 − 74.600 = 802.56 kJ/mol over 16.043 g/mol.
    expect(materialByKey('methane')?.net_heat_MJ_kg).toBeCloseTo(802.56 / 16.043, 1);
  });
});

/** Gross heats, MJ/kg: by oxygen consumption and from the literature as quoted in the same report (FAA, p. 10). */
const POLYMERS: readonly (readonly [key: string, unit: string, faa: number, literature: number])[] = [
  ['polyethylene', 'C2H4', 47.7, 46.2],
  ['polypropylene', 'C3H6', 45.8, 46.4],
  ['polystyrene', 'C8H8', 43.7, 42.5],
  ['pmma', 'C5H8O2', 26.8, 26.6],
  ['polycarbonate', 'C16H14O3', 31.3, 31.0],
  ['pet', 'C10H8O4', 24.1, 22.2],
  ['nylon', 'C12H22N2O2', 30.9, 29.6],
  ['pva', 'C2H4O', 23.3, 25.0],
  ['ppo', 'C8H8O', 34.2, 34.6],
];

describe('heats of polymers', () => {
  it.each(POLYMERS)('%s: the row lies with the net heats of the report, within 4 %%', (key, unit, faa, literature) => {
    const atoms: Record<string, number> = {};
    for (const [, element = '', count = ''] of unit.matchAll(/([A-Z])(\d*)/g)) {
      atoms[element] = Number(count === '' ? 1 : count);
    }
    const molar = Object.entries(atoms).reduce((sum, [element, n]) => sum + n * (ATOMIC[element] ?? Number.NaN), 0);
    const water = (((atoms['H'] ?? 0) * 1.008) / molar) * 8.937 * 2.442;
    const net = [faa - water, literature - water];
    const row = materialByKey(key);
    expect(row?.net_heat_MJ_kg).toBeGreaterThan(Math.min(...net) * 0.96);
    expect(row?.net_heat_MJ_kg).toBeLessThan(Math.max(...net) * 1.04);
    // The report's own values lie inside the range the row admits, to its 4.4 % uncertainty.
    expect(row?.low_MJ_kg).toBeLessThan(Math.max(...net) * 1.044);
    expect(row?.high_MJ_kg).toBeGreaterThan(Math.min(...net) * 0.956);
  });
});
