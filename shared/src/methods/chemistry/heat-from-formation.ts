import { formationOfProducts, VAPORISATION_KJ_MOL } from '../../chemistry/formation-enthalpies.ts';
import { molarMass, OXYGEN_G_MOL } from '../../chemistry/molar-mass.ts';
import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';
import { ATOM_INPUTS } from './atom-inputs.ts';
import { burn } from './burn.ts';

/** Heat of combustion of ONE mole and of one kilogram from the enthalpy of formation, in the phase that enthalpy is for. */
export const heatFromFormation = defineMethod({
  id: 'chemistry.heat-from-formation',
  version: 1,
  title: 'Heat of combustion from the enthalpy of formation',
  symbol: 'ΔH_c,net',
  unit: 'MJ/kg',
  inputs: {
    ...ATOM_INPUTS,
    dH_f: { symbol: 'ΔH_f', unit: 'kJ/mol', quantity: 'Enthalpy of formation at 298.15 K', valid: [-1e6, 1e6] },
  },
  equation:
    'ΔH_c,net = ΔH_f − [a ΔH_f,CO2 + (b − f)/2 ΔH_f,H2O(g) + e ΔH_f,SO2 + f ΔH_f,HX];  gross adds 44.004 kJ per mol of water',
  sources: [
    {
      title: 'CRC Handbook of Chemistry and Physics',
      locator: 'enthalpies of formation, open data set chemicals 1.5.2',
    },
    definition('Hess’s law, per one mole of fuel'),
  ],
  assumptions: [
    'The phase is the one of ΔH_f: a liquid’s heat is its vapour’s less the heat of vaporisation.',
    'Complete combustion; good tables differ by up to 6 kJ/mol for some fuels: one is chosen and named, never a mean.',
  ],
  why: 'For a pure substance no measurement is nearer.',
  outOfRange: 'refuse',
  outputs: {
    netPerMole: { symbol: 'ΔH_c,net', unit: 'kJ/mol', quantity: 'Net heat of one mole' },
    grossPerMole: { symbol: 'ΔH_c,gross', unit: 'kJ/mol', quantity: 'Gross heat of one mole' },
    net: { symbol: 'H_net', unit: 'MJ/kg', quantity: 'Net heat' },
    gross: { symbol: 'H_gross', unit: 'MJ/kg', quantity: 'Gross heat' },
    oxygen: { symbol: 'r_O2', unit: 'kg/kg', quantity: 'Oxygen per fuel' },
    perOxygen: { symbol: 'E', unit: 'MJ/kg', quantity: 'Net heat per kg of oxygen' },
  },
  run({ dH_f, ...atoms }) {
    const products = burn(atoms);
    const mass = molarMass(atoms);
    const netPerMole = dH_f - formationOfProducts(products);
    const grossPerMole = netPerMole + VAPORISATION_KJ_MOL * products.H2O;
    const oxygen = (OXYGEN_G_MOL * products.O2) / mass;
    return {
      netPerMole,
      grossPerMole,
      net: netPerMole / mass,
      gross: grossPerMole / mass,
      oxygen,
      perOxygen: netPerMole / mass / oxygen,
    };
  },
});
