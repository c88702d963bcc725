import { VAPORISATION_KJ_MOL } from '../../chemistry/formation-enthalpies.ts';
import { molarMass, OXYGEN_G_MOL } from '../../chemistry/molar-mass.ts';
import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { definition } from '../sources.ts';
import { ATOM_INPUTS } from './atom-inputs.ts';
import { burn } from './burn.ts';

/** Net heat of a substance or a polymer's repeat unit from its gross heat and formula. */
export const netOfFormula = defineMethod({
  id: 'chemistry.net-of-formula',
  version: 1,
  title: 'Net heat from gross heat and formula',
  symbol: 'H_net',
  unit: 'MJ/kg',
  inputs: {
    ...ATOM_INPUTS,
    gross: { symbol: 'H_gross', unit: 'MJ/kg', quantity: 'Gross heat', valid: [0, 150] },
  },
  equation: 'H_net = H_gross − 44.004 (b − f)/(2 M)',
  sources: [
    definition('heat of vaporisation of water 44.004 kJ/mol at 25 °C'),
    {
      title: 'Walters, Hackbarth & Lyon, Heats of combustion of high temperature polymers',
      locator: 'page 10: gross heats',
    },
  ],
  assumptions: ['Hydrogen bound as acid of a halogen forms no water.'],
  why: 'Polymer reports give gross heats per repeat unit; a fire gives the net heat.',
  outOfRange: 'refuse',
  outputs: {
    net: { symbol: 'H_net', unit: 'MJ/kg', quantity: 'Net heat' },
    oxygen: { symbol: 'r_O2', unit: 'kg/kg', quantity: 'Oxygen per fuel' },
    perOxygen: { symbol: 'E', unit: 'MJ/kg', quantity: 'Net heat per kg of oxygen' },
  },
  run({ gross, ...atoms }) {
    const { O2, H2O } = burn(atoms);
    const mass = molarMass(atoms);
    const net = gross - (VAPORISATION_KJ_MOL * H2O) / mass;
    if (net < 0) throw new OutOfRangeError('The water of this formula takes more than the gross heat: check both.');
    const oxygen = (OXYGEN_G_MOL * O2) / mass;
    return { net, oxygen, perOxygen: net / oxygen };
  },
});
