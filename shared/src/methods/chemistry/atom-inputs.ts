/** Atoms in one mole, as inputs of a method; a substance without an element has 0 of it. */
export const ATOM_INPUTS = {
  C: { symbol: 'a', unit: '', quantity: 'Carbon atoms', valid: [0, 1e5] },
  H: { symbol: 'b', unit: '', quantity: 'Hydrogen atoms', valid: [0, 1e5] },
  O: { symbol: 'c', unit: '', quantity: 'Oxygen atoms', valid: [0, 1e5] },
  N: { symbol: 'd', unit: '', quantity: 'Nitrogen atoms', valid: [0, 1e5] },
  S: { symbol: 'e', unit: '', quantity: 'Sulfur atoms', valid: [0, 1e5] },
  F: { symbol: 'f_F', unit: '', quantity: 'Fluorine atoms', valid: [0, 1e5] },
  Cl: { symbol: 'f_Cl', unit: '', quantity: 'Chlorine atoms', valid: [0, 1e5] },
  Br: { symbol: 'f_Br', unit: '', quantity: 'Bromine atoms', valid: [0, 1e5] },
} as const;
