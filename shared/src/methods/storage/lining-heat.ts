import { defineMethod } from '../define-method.ts';
import { en1991 } from '../sources.ts';

/** Heat of a combustible lining, MJ. */
export const liningHeat = defineMethod({
  id: 'storage.lining-heat-2002',
  version: 1,
  title: 'Heat of a lining',
  symbol: 'Q',
  unit: 'MJ',
  inputs: {
    A: { symbol: 'A', unit: 'm2', quantity: 'Area', valid: [0, 1e6] },
    d: { symbol: 'δ', unit: 'm', quantity: 'Thickness', valid: [1e-5, 1] },
    rho: { symbol: 'ρ', unit: 'kg/m3', quantity: 'Density', valid: [1, 3000] },
    H: { symbol: 'H_u', unit: 'MJ/kg', quantity: 'Net heat', valid: [0, 150] },
  },
  equation: 'Q = A δ ρ H_u',
  sources: [en1991('E.2.1: linings belong to the fixed load')],
  assumptions: ['All of it burns.'],
  why: 'Linings are load as much as furniture; surveys of contents leave them out.',
  outOfRange: 'refuse',
  run: ({ A, d, rho, H }) => A * d * rho * H,
});
