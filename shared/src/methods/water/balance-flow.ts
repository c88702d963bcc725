import { defineMethod } from '../define-method.ts';
import { recalled, definition } from '../sources.ts';

const S_PER_MIN = 60;

/** Flow whose heat of boiling equals a heat release rate, L/s. A heat balance, not a required supply. */
export const balanceFlow = defineMethod({
  id: 'water.balance-flow',
  version: 1,
  title: 'Flow that would balance a heat release rate, theoretical',
  symbol: 'F',
  unit: 'L/s',
  inputs: {
    Q: { symbol: 'Q', unit: 'MW', quantity: 'Heat release rate', valid: [0, 1e4] },
    eta: { symbol: 'η', unit: '', quantity: 'Share of the water that boils in the fire', valid: [0.05, 1] },
    h: { symbol: 'h_w', unit: 'MJ/kg', quantity: 'Heat that water takes up', valid: [2, 4] },
  },
  equation: 'F = Q/(η h_w)',
  sources: [
    definition('heat balance; 1 L of water is 1 kg'),
    { title: 'Särdqvist, Lund University report 1014', locator: '5.3: flames go out at 30 to 35 % of the heat' },
    recalled('Barnett, SFPE New Zealand TP 2004/1', 'η 0.5 for hand lines'),
  ],
  assumptions: ['η 0.3 to 0.5 for hand lines. Local rules set what must be supplied.'],
  why: 'A feeling for size; nothing is to be sized by it.',
  outOfRange: 'refuse',
  outputs: {
    perSecond: { symbol: 'F', unit: 'L/s', quantity: 'Theoretical flow' },
    perMinute: { symbol: 'F', unit: 'L/min', quantity: 'Theoretical flow' },
  },
  run({ Q, eta, h }) {
    const perSecond = Q / (eta * h);
    return { perSecond, perMinute: perSecond * S_PER_MIN };
  },
});
