import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Heat of a cylinder and the fireball if it ruptures. Always a hazard flag as well. */
export const gasCylinder = defineMethod({
  id: 'storage.gas-cylinder',
  version: 1,
  title: 'Gas cylinder',
  symbol: 'Q',
  unit: 'MJ',
  inputs: {
    m: { symbol: 'm', unit: 'kg', quantity: 'Mass of gas', valid: [0, 30_000] },
    H: { symbol: 'ΔH_c', unit: 'MJ/kg', quantity: 'Net heat', valid: [0, 125] },
  },
  equation: 'Q = m ΔH_c;  D = 5.8 m^(1/3);  t = 0.45 m^(1/3)',
  sources: [
    recalled(
      'CCPS, Guidelines for vapor cloud explosion, BLEVE and flash fire hazards',
      'fireball of liquefied gas under 30 t',
    ),
  ],
  assumptions: ['Fireball of a liquefied gas. No container without a rating reduces it.'],
  why: 'Its megajoules are few; what it does to crews in one second is not.',
  outOfRange: 'refuse',
  outputs: {
    heat: { symbol: 'Q', unit: 'MJ', quantity: 'Heat' },
    fireball: { symbol: 'D', unit: 'm', quantity: 'Diameter of the fireball' },
    time: { symbol: 't', unit: 's', quantity: 'Time of the fireball' },
  },
  run: ({ m, H }) => ({ heat: m * H, fireball: 5.8 * Math.cbrt(m), time: 0.45 * Math.cbrt(m) }),
});
