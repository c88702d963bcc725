import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { en1991 } from '../sources.ts';

/** Thermal inertia of a room, weighted by the areas of its surfaces without openings. */
export const meanThermalInertia = defineMethod({
  id: 'burnout.mean-thermal-inertia-2002',
  version: 1,
  title: 'Thermal inertia of the room',
  symbol: 'b',
  unit: 'J/m2s1/2K',
  inputs: {
    b: { symbol: 'b_j', unit: 'J/m2s1/2K', quantity: 'Thermal inertia of a surface', valid: [0, Infinity], list: true },
    A: {
      symbol: 'A_j',
      unit: 'm2',
      quantity: 'Area of the surface, openings left out',
      valid: [0, Infinity],
      list: true,
    },
  },
  equation: 'b = Σ b_j A_j / (A_t − A_v)',
  sources: [en1991('Annex A(8), equation (A.5)')],
  assumptions: ['Areas are those without the openings that count after the glass has broken.'],
  why: 'The annex averages over what the fire touches, while O divides by A_t with openings.',
  outOfRange: 'refuse',
  run({ b, A }) {
    let sum = 0;
    let area = 0;
    for (let i = 0; i < b.length; i += 1) {
      sum += b[i]! * A[i]!;
      area += A[i]!;
    }
    if (!(area > 0)) throw new OutOfRangeError('No surface has an area: check the openings against the walls.');
    return sum / area;
  },
});
