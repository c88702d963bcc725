import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';

/** A net heat taken over as somebody states it, so that it too opens a working with its origin. */
export const statedHeat = defineMethod({
  id: 'heat.stated',
  version: 1,
  title: 'Net heat as stated',
  symbol: 'H_net',
  unit: 'MJ/kg',
  inputs: { H: { symbol: 'H_stated', unit: 'MJ/kg', quantity: 'Net heat as stated', valid: [0, 1000] } },
  equation: 'H_net = H_stated',
  sources: [definition('taken over unchanged; the sheet is named beside it')],
  assumptions: ['The sheet is right about net or gross, and about its water.'],
  why: 'Nothing is known that would change it.',
  outOfRange: 'refuse',
  run: ({ H }) => H,
});
