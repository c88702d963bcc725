import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Variant: ventilation factor of wall openings together with a roof vent, m^5/2. */
export const roofVentEquivalent = defineMethod({
  id: 'room.roof-vent-equivalent',
  version: 1,
  title: 'Ventilation factor with a roof vent',
  symbol: 'F_fict',
  unit: 'm5/2',
  inputs: {
    F: { symbol: 'A_v √h', unit: 'm5/2', quantity: 'Ventilation factor of wall openings', valid: [1e-9, Infinity] },
    A_h: { symbol: 'A_h', unit: 'm2', quantity: 'Area of the roof vent', valid: [0, Infinity] },
    h_d: { symbol: 'h_d', unit: 'm', quantity: 'From mid-height of the wall opening to the vent', valid: [1e-3, 100] },
    share: { symbol: 'A_h √h_d/(A_v √h)', unit: '', quantity: 'Roof vent over wall openings', valid: [0.3, 1.5] },
  },
  equation: 'F_fict = A_v √h + 2.3 A_h √h_d',
  sources: [recalled('Buchanan, Structural Design for Fire Safety, after Magnusson & Thelandersson', 'roof vents')],
  assumptions: ['For a vent that is open beside a wall opening.'],
  why: 'The other relations know wall openings only.',
  outOfRange: 'warn',
  run: ({ F, A_h, h_d }) => F + 2.3 * A_h * Math.sqrt(h_d),
});
