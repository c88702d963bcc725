import { VAPORISATION_KJ_MOL } from '../../chemistry/formation-enthalpies.ts';
import { molarMass, OXYGEN_G_MOL } from '../../chemistry/molar-mass.ts';
import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { definition } from '../sources.ts';
import { ATOM_INPUTS } from './atom-inputs.ts';
import { burn } from './burn.ts';

/** Heat of one mole and one kilogram from a thermochemical equation that is written for n moles of fuel. */
export const heatFromEquation = defineMethod({
  id: 'chemistry.heat-from-equation',
  version: 1,
  title: 'Heat from a thermochemical equation',
  symbol: 'H_net',
  unit: 'MJ/kg',
  inputs: {
    ...ATOM_INPUTS,
    n: { symbol: 'n', unit: '', quantity: 'Moles of fuel in the equation', valid: [1e-3, 1e4] },
    dH: { symbol: 'ΔH', unit: 'kJ', quantity: 'Enthalpy of the equation as written, negative', valid: [-1e10, -1e-6] },
    water: { symbol: '', quantity: 'Water in the equation is', choices: ['vapour', 'liquid'] },
  },
  equation: 'ΔH_c = −ΔH/n;  liquid water: net = gross − 44.004 kJ per mol of water;  H = ΔH_c/M',
  sources: [definition('molar heat of the fuel: the equation’s enthalpy over its moles of fuel')],
  assumptions: ['Combustion is complete and at constant pressure.'],
  why: 'Equations are written with whole numbers: 2 C8H18 + 25 O2. The division by 2 is the step that gets lost.',
  outOfRange: 'refuse',
  outputs: {
    netPerMole: { symbol: 'ΔH_c,net', unit: 'kJ/mol', quantity: 'Net heat of one mole' },
    net: { symbol: 'H_net', unit: 'MJ/kg', quantity: 'Net heat' },
    gross: { symbol: 'H_gross', unit: 'MJ/kg', quantity: 'Gross heat' },
    perOxygen: { symbol: 'E', unit: 'MJ/kg', quantity: 'Net heat per kg of oxygen' },
  },
  run({ n, dH, water, ...atoms }) {
    const products = burn(atoms);
    const mass = molarMass(atoms);
    const inWater = VAPORISATION_KJ_MOL * products.H2O;
    const netPerMole = -dH / n - (water === 'liquid' ? inWater : 0);
    if (!(netPerMole > 0))
      throw new OutOfRangeError(
        'As vapour the water takes more heat than the equation gives: check ΔH, n and the water.',
      );
    return {
      netPerMole,
      net: netPerMole / mass,
      gross: (netPerMole + inWater) / mass,
      perOxygen: netPerMole / (OXYGEN_G_MOL * products.O2),
    };
  },
  explain: ({ n, dH }) => [{ text: 'Enthalpy of one mole, ΔH/n', value: dH / n, unit: 'kJ/mol' }],
});
