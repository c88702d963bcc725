import { defineMethod } from '../define-method.ts';
import { en1991, jcss } from '../sources.ts';

/** Several vertical openings as one: area, equivalent height and ventilation factor. No opening: all 0. */
export const openings = defineMethod({
  id: 'room.openings-2002',
  version: 1,
  title: 'Openings taken together',
  symbol: 'A_v √h_eq',
  unit: 'm5/2',
  inputs: {
    A: { symbol: 'A_i', unit: 'm2', quantity: 'Area of an opening', valid: [0, Infinity], list: true },
    h: { symbol: 'h_i', unit: 'm', quantity: 'Height of the opening', valid: [0, 100], list: true },
  },
  equation: 'A_v = Σ A_i;  h_eq = Σ A_i h_i / A_v;  F = A_v √h_eq',
  sources: [en1991('Annex A, definitions of A_v and h_eq'), jcss('equation (2.20.7)')],
  assumptions: ['Vertical openings only. Σ A_i √h_i, which is 1 to 3 % lower for mixed heights, is not used.'],
  why: 'The parametric curve and the opening factor are defined with the area-weighted height.',
  outOfRange: 'refuse',
  outputs: {
    area: { symbol: 'A_v', unit: 'm2', quantity: 'Area of openings' },
    height: { symbol: 'h_eq', unit: 'm', quantity: 'Equivalent height' },
    factor: { symbol: 'A_v √h_eq', unit: 'm5/2', quantity: 'Ventilation factor' },
  },
  run({ A, h }) {
    let area = 0;
    let moment = 0;
    for (let i = 0; i < A.length; i += 1) {
      area += A[i]!;
      moment += A[i]! * h[i]!;
    }
    const height = area > 0 ? moment / area : 0;
    return { area, height, factor: area * Math.sqrt(height) };
  },
  explain: (_inputs, { area, height }) => [
    { text: 'Area of openings A_v', value: area, unit: 'm2' },
    { text: 'Equivalent height h_eq', value: height, unit: 'm' },
  ],
});
