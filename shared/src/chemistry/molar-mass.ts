import { ELEMENTS, type Atoms, type Element } from './atoms.ts';

/** Conventional atomic weights, g/mol, after IUPAC, as read in the open data set `chemicals` 1.5.2. */
export const ATOMIC_WEIGHTS: Readonly<Record<Element, number>> = {
  C: 12.011,
  H: 1.008,
  O: 15.999,
  N: 14.007,
  S: 32.06,
  F: 18.998,
  Cl: 35.45,
  Br: 79.904,
};

/** Oxygen gas, g/mol. */
export const OXYGEN_G_MOL = 31.998;
/** Carbon dioxide, g/mol. */
export const CARBON_DIOXIDE_G_MOL = 44.009;

/** Mass of one mole, g/mol; 0 for no atoms. */
export function molarMass(atoms: Atoms): number {
  let mass = 0;
  for (const element of ELEMENTS) mass += atoms[element] * ATOMIC_WEIGHTS[element];
  return mass;
}
