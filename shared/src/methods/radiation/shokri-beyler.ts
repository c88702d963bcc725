import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Heat flux on the ground beside a pool fire by distance alone, kW/m². */
export const shokriBeyler = defineMethod({
  id: 'radiation.shokri-beyler',
  version: 1,
  title: 'Radiation of a pool fire by distance, Shokri and Beyler',
  symbol: 'q″',
  unit: 'kW/m2',
  inputs: {
    L: { symbol: 'L', unit: 'm', quantity: 'Distance from the middle of the pool', valid: [0.1, 1000] },
    D: { symbol: 'D', unit: 'm', quantity: 'Diameter of the pool', valid: [0.1, 100] },
    ratio: { symbol: 'L/D', unit: '', quantity: 'Distance against diameter', valid: [0.7, 15] },
  },
  equation: 'q″ = 15.4 (L/D)^(−1.59)',
  sources: [recalled('Shokri & Beyler, Radiation from large pool fires', 'empirical relation', '1989')],
  assumptions: ['Target upright at ground level; a factor of 2 covers the scatter in design.'],
  why: 'A first look that needs no flame height.',
  outOfRange: 'warn',
  run: ({ L, D }) => 15.4 * (L / D) ** -1.59,
});
