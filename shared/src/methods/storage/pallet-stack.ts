import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Heat release rate of a stack of wooden pallets, per floor area and in all. */
export const palletStack = defineMethod({
  id: 'storage.pallet-stack',
  version: 1,
  title: 'Stack of pallets',
  symbol: 'q″',
  unit: 'kW/m2',
  inputs: {
    h_p: { symbol: 'h_p', unit: 'm', quantity: 'Height of the stack', valid: [0.5, 4.5] },
    M: { symbol: 'M', unit: '%', quantity: 'Moisture, of dry mass', valid: [0, 25] },
    A: { symbol: 'A', unit: 'm2', quantity: 'Footprint', valid: [0.1, 1000] },
    reading: { symbol: '', quantity: 'Coefficient of the moisture', choices: ['0.027', '0.03'] },
  },
  equation: 'q″ = 919 (1 + 2.14 h_p)(1 − 0.027 M);  some editions print 0.03 M',
  sources: [recalled('Babrauskas, SFPE Handbook of Fire Protection Engineering', 'fit to the pallet tests of Krasner')],
  assumptions: [
    'The whole stack burns. Which coefficient is right was not settled; they are 2 % apart at 6 %, 5 % at 12 %.',
    'Older plateau figures for the same stacks are about 30 % higher.',
  ],
  why: 'Pallets stand in every store and burn faster than most of what they carry.',
  outOfRange: 'warn',
  outputs: {
    perArea: { symbol: 'q″', unit: 'kW/m2', quantity: 'Heat release rate per floor area' },
    rate: { symbol: 'Q', unit: 'kW', quantity: 'Heat release rate' },
  },
  run({ h_p, M, A, reading }) {
    const perArea = Math.max(0, 919 * (1 + 2.14 * h_p) * (1 - (reading === '0.03' ? 0.03 : 0.027) * M));
    return { perArea, rate: perArea * A };
  },
});
