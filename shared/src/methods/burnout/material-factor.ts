import { defineMethod } from '../define-method.ts';
import { dbSi, en1991 } from '../sources.ts';

/** Correction factor k_c of unprotected steel. */
export const unprotectedSteelFactor = defineMethod({
  id: 'burnout.unprotected-steel-2002',
  version: 1,
  title: 'Correction factor of unprotected steel',
  symbol: 'k_c',
  unit: '',
  inputs: { O: { symbol: 'O', unit: 'm1/2', quantity: 'Opening factor', valid: [0.02, 0.2] } },
  equation: 'k_c = 13.7 O',
  sources: [en1991('Annex F, Table F.1'), dbSi('Table B.1')],
  assumptions: ['Reinforced concrete and protected steel take 1; timber and composite members are excluded.'],
  why: 'Unprotected steel follows the gas and not the walls.',
  outOfRange: 'refuse',
  run: ({ O }) => 13.7 * O,
});
