import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';

/** Net heat with a proposal of the basis check taken over by a person, MJ/kg. */
export const basisCorrection = defineMethod({
  id: 'chemistry.basis-correction',
  version: 1,
  title: 'Heat with the correction of its basis',
  symbol: 'H_net',
  unit: 'MJ/kg',
  inputs: {
    H: { symbol: 'H_stated', unit: 'MJ/kg', quantity: 'Net heat as stated', valid: [0, 1e6] },
    k: { symbol: 'k', unit: '', quantity: 'Factor proposed by the check', valid: [0.01, 100] },
  },
  equation: 'H_net = k H_stated',
  sources: [definition('the factor of the basis check: 13.1 over the heat per kg of oxygen, as a simple ratio')],
  assumptions: ['A person looked at the proposal and took it over; the stated value stays beside it.'],
  why: 'A value for two moles taken for one is corrected in the open or not at all.',
  outOfRange: 'refuse',
  run: ({ H, k }) => k * H,
});
