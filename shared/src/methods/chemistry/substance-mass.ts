import { molarMass } from '../../chemistry/molar-mass.ts';
import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { ATOM_INPUTS } from './atom-inputs.ts';

/** Mass of one mole, g/mol. */
export const substanceMass = defineMethod({
  id: 'chemistry.molar-mass',
  version: 1,
  title: 'Molar mass',
  symbol: 'M',
  unit: 'g/mol',
  inputs: ATOM_INPUTS,
  equation: 'M = 12.011 a + 1.008 b + 15.999 c + 14.007 d + 32.06 e + 18.998 f_F + 35.45 f_Cl + 79.904 f_Br',
  sources: [{ title: 'IUPAC, conventional atomic weights', locator: 'as in the open data set chemicals 1.5.2' }],
  assumptions: ['Natural isotopes.'],
  why: 'Heats per mole become heats per kilogram through it.',
  outOfRange: 'refuse',
  run(atoms) {
    const mass = molarMass(atoms);
    if (mass === 0) throw new OutOfRangeError('The formula has no atoms.');
    return mass;
  },
});
