import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Emissive power of the flame of a large pool, kW/m². */
export const emissivePower = defineMethod({
  id: 'radiation.emissive-power',
  version: 1,
  title: 'Emissive power of a pool fire, Shokri and Beyler',
  symbol: 'E',
  unit: 'kW/m2',
  inputs: { D: { symbol: 'D', unit: 'm', quantity: 'Diameter of the pool', valid: [1, 50] } },
  equation: 'E = 58 · 10^(−0.00823 D)',
  sources: [recalled('Shokri & Beyler, Radiation from large pool fires', 'emissive power', '1989')],
  assumptions: ['A mean over the whole flame as a cylinder; smoke shields large pools.'],
  why: 'It was fitted together with the cylinder’s view factor.',
  outOfRange: 'warn',
  run: ({ D }) => 58 * 10 ** (-0.00823 * D),
});
