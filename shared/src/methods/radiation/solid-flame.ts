import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Heat flux from a flame taken as a radiating body, kW/m². */
export const solidFlame = defineMethod({
  id: 'radiation.solid-flame',
  version: 1,
  title: 'Radiation of a solid flame',
  symbol: 'q″',
  unit: 'kW/m2',
  inputs: {
    E: { symbol: 'E', unit: 'kW/m2', quantity: 'Emissive power', valid: [0, 200] },
    F: { symbol: 'F', unit: '', quantity: 'View factor', valid: [0, 1] },
  },
  equation: 'q″ = E F',
  sources: [
    recalled('Shokri & Beyler, Radiation from large pool fires', 'detailed relation; best above 5 kW/m2', '1989'),
  ],
  assumptions: ['Clear air between.'],
  why: 'For targets near a pool, where a point source is too crude.',
  outOfRange: 'refuse',
  run: ({ E, F }) => E * F,
});
