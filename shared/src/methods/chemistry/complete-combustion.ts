import { CARBON_DIOXIDE_G_MOL, molarMass, OXYGEN_G_MOL } from '../../chemistry/molar-mass.ts';
import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';
import { ATOM_INPUTS } from './atom-inputs.ts';
import { burn } from './burn.ts';

/** Oxygen in dry air by mass: 0.2095 by volume, 28.965 g/mol. */
export const OXYGEN_IN_AIR = 0.2314;

/** Complete combustion of one mole: moles of oxygen and products, oxygen and air per kg of fuel. */
export const completeCombustion = defineMethod({
  id: 'chemistry.complete-combustion',
  version: 1,
  title: 'Complete combustion',
  symbol: 'ν',
  unit: '',
  inputs: ATOM_INPUTS,
  equation: 'ν = a + e + (b − f)/4 − c/2;  CO2 a;  H2O (b − f)/2;  N2 d/2;  SO2 e;  HX f;  r_O2 = 31.998 ν/M',
  sources: [definition('mole balance; oxygen 0.2314 of dry air by mass')],
  assumptions: ['Products are CO2, H2O, N2, SO2 and HX. With more halogen than hydrogen it is not covered.'],
  why: 'Oxygen demand, air demand and every heat from formation enthalpies start here.',
  outOfRange: 'refuse',
  outputs: {
    O2: { symbol: 'ν', unit: '', quantity: 'Oxygen, mol per mol' },
    CO2: { symbol: 'CO2', unit: '', quantity: 'Carbon dioxide, mol per mol' },
    H2O: { symbol: 'H2O', unit: '', quantity: 'Water, mol per mol' },
    N2: { symbol: 'N2', unit: '', quantity: 'Nitrogen, mol per mol' },
    SO2: { symbol: 'SO2', unit: '', quantity: 'Sulfur dioxide, mol per mol' },
    HX: { symbol: 'HX', unit: '', quantity: 'Acids of halogens, mol per mol' },
    oxygen: { symbol: 'r_O2', unit: 'kg/kg', quantity: 'Oxygen per fuel' },
    air: { symbol: 'r_air', unit: 'kg/kg', quantity: 'Dry air per fuel' },
    carbonDioxide: { symbol: 'r_CO2', unit: 'kg/kg', quantity: 'Carbon dioxide per fuel' },
  },
  run(atoms) {
    const { O2, CO2, H2O, N2, SO2, HF, HCl, HBr } = burn(atoms);
    const mass = molarMass(atoms);
    const oxygen = (OXYGEN_G_MOL * O2) / mass;
    return {
      O2,
      CO2,
      H2O,
      N2,
      SO2,
      HX: HF + HCl + HBr,
      oxygen,
      air: oxygen / OXYGEN_IN_AIR,
      carbonDioxide: (CARBON_DIOXIDE_G_MOL * CO2) / mass,
    };
  },
});
