/** Mass fractions of an ultimate analysis, dry; `w_ash` is what is left after burning. */
export const FRACTION_INPUTS = {
  w_C: { symbol: 'C', unit: 'kg/kg', quantity: 'Carbon', valid: [0, 1] },
  w_H: { symbol: 'H', unit: 'kg/kg', quantity: 'Hydrogen', valid: [0, 1] },
  w_O: { symbol: 'O', unit: 'kg/kg', quantity: 'Oxygen', valid: [0, 1] },
  w_N: { symbol: 'N', unit: 'kg/kg', quantity: 'Nitrogen', valid: [0, 1] },
  w_S: { symbol: 'S', unit: 'kg/kg', quantity: 'Sulfur', valid: [0, 1] },
} as const;
