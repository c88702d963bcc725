import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { recalled } from '../sources.ts';

/** Heat transfer coefficient of a room with different linings, weighted by their areas, kW/m²K. */
export const meanHeatTransfer = defineMethod({
  id: 'room.mean-heat-transfer',
  version: 1,
  title: 'Heat transfer into all linings',
  symbol: 'h_k',
  unit: 'kW/m2K',
  inputs: {
    h: { symbol: 'h_k,i', unit: 'kW/m2K', quantity: 'Heat transfer into a surface', valid: [0, 1e6], list: true },
    A: { symbol: 'A_i', unit: 'm2', quantity: 'Area of the surface', valid: [0, Infinity], list: true },
  },
  equation: 'h_k = Σ h_k,i A_i / Σ A_i',
  sources: [recalled('Karlsson & Quintiere, Enclosure Fire Dynamics', 'several linings')],
  assumptions: ['Openings that count are not part of any surface.'],
  why: 'Heat flows into all surfaces side by side.',
  outOfRange: 'refuse',
  run({ h, A }) {
    let flow = 0;
    let area = 0;
    for (let i = 0; i < A.length; i += 1) {
      flow += h[i]! * A[i]!;
      area += A[i]!;
    }
    if (!(area > 0)) throw new OutOfRangeError('No surface has an area: check the openings against the walls.');
    return flow / area;
  },
});
