import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

const KINDS = {
  thermoset: { perArea: 150, spread: 0.3 },
  thermoplastic: { perArea: 250, spread: 0.9 },
} as const;
const M_PER_MM = 1e-3;

/** Heat release rate of the burning part of a cable tray and how far the fire has run along it. */
export const cableTray = defineMethod({
  id: 'storage.cable-tray',
  version: 1,
  title: 'Burning cable tray',
  symbol: 'Q',
  unit: 'kW',
  inputs: {
    A: { symbol: 'A', unit: 'm2', quantity: 'Area of tray that burns', valid: [0, 1e4] },
    kind: { symbol: '', quantity: 'Cables', choices: ['thermoset', 'thermoplastic'] },
    t: { symbol: 't', unit: 's', quantity: 'Time since it burns', valid: [0, 86_400] },
  },
  equation: 'Q = A · 150 (thermoset) or 250 kW/m2 (thermoplastic);  spread 0.3 or 0.9 mm/s to each side',
  sources: [
    recalled(
      'NUREG/CR-7010, Cable heat release, ignition and spread in tray installations',
      'horizontal trays',
      '2012',
    ),
  ],
  assumptions: ['Horizontal, one tray. Stacks light one another and burn faster.'],
  why: 'Cables burn slowly and long; area and speed are what is known.',
  outOfRange: 'refuse',
  outputs: {
    rate: { symbol: 'Q', unit: 'kW', quantity: 'Heat release rate' },
    spread: { symbol: 's', unit: 'm', quantity: 'Length the fire has run to each side' },
  },
  run: ({ A, kind, t }) => ({ rate: A * KINDS[kind].perArea, spread: KINDS[kind].spread * M_PER_MM * t }),
});
