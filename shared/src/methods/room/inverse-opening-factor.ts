import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { recalled } from '../sources.ts';

/** Inverse opening factor after Thomas, m^-½; above 10 to 15 the openings control the fire. */
export const inverseOpeningFactor = defineMethod({
  id: 'room.inverse-opening-factor',
  version: 1,
  title: 'Inverse opening factor',
  symbol: 'Ω',
  unit: 'm-1/2',
  inputs: {
    A_t: { symbol: 'A_t', unit: 'm2', quantity: 'Enclosing area, openings included', valid: [1e-6, Infinity] },
    A_v: { symbol: 'A_v', unit: 'm2', quantity: 'Area of openings', valid: [1e-9, Infinity] },
    H: { symbol: 'H', unit: 'm', quantity: 'Height of openings', valid: [1e-6, 100] },
  },
  equation: 'Ω = (A_t − A_v) / (A_v √H)',
  sources: [recalled('Thomas & Heselden, Fully developed fires in single compartments', 'parameter Ω', '1972')],
  assumptions: [],
  why: 'A second view of the same openings, used in the older literature.',
  outOfRange: 'refuse',
  run({ A_t, A_v, H }) {
    if (A_v > A_t) throw new OutOfRangeError('The openings are larger than the room: A_t must not be below A_v.');
    return (A_t - A_v) / (A_v * Math.sqrt(H));
  },
});
