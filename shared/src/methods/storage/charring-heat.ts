import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

const RATE_MM_MIN = { softwood: 0.65, hardwood: 0.5 } as const;
const M_PER_MM = 1e-3;

/** Heat of exposed structural timber that chars during a fire, MJ. */
export const charringHeat = defineMethod({
  id: 'storage.charring-heat-2004',
  version: 1,
  title: 'Heat of charring timber',
  symbol: 'Q',
  unit: 'MJ',
  inputs: {
    A: { symbol: 'A', unit: 'm2', quantity: 'Exposed area', valid: [0, 1e6] },
    t: { symbol: 't', unit: 'min', quantity: 'Time of exposure', valid: [0, 240] },
    wood: { symbol: 'β_0', quantity: 'Wood', choices: ['softwood', 'hardwood'] },
    rho: { symbol: 'ρ', unit: 'kg/m3', quantity: 'Density', valid: [290, 1000] },
    H: { symbol: 'H_u', unit: 'MJ/kg', quantity: 'Net heat', valid: [10, 21] },
    d: { symbol: 'δ', unit: 'm', quantity: 'Thickness that can char', valid: [1e-3, 5] },
  },
  equation: 'Q = A min(β_0 t ; δ) ρ H_u;  β_0 0.65 mm/min softwood, 0.50 hardwood of 450 kg/m3 and more',
  sources: [recalled('EN 1995-1-2', 'Table 3.1, one-dimensional charring', '2004')],
  assumptions: [
    'Standard exposure; t and the load depend on one another and are found by turns.',
    'With exposed timber the parametric curve and the equivalent time are out of their scope.',
  ],
  why: 'Structure counts only as far as it chars.',
  outOfRange: 'refuse',
  outputs: {
    heat: { symbol: 'Q', unit: 'MJ', quantity: 'Heat' },
    depth: { symbol: 'd_char', unit: 'm', quantity: 'Depth of char' },
  },
  run({ A, t, wood, rho, H, d }) {
    const depth = Math.min(d, RATE_MM_MIN[wood] * t * M_PER_MM);
    return { heat: A * depth * rho * H, depth };
  },
});
