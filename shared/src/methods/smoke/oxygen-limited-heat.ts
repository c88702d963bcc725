import { OXYGEN_IN_AIR } from '../chemistry/complete-combustion.ts';
import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { definition, recalled } from '../sources.ts';

const PER_OXYGEN = 13.1;

/** Heat that the oxygen of a closed room can feed until flames go out, MJ. */
export const oxygenLimitedHeat = defineMethod({
  id: 'smoke.oxygen-limited-heat',
  version: 1,
  title: 'Heat that the oxygen of the room can feed',
  symbol: 'E_O2',
  unit: 'MJ',
  inputs: {
    V: { symbol: 'V', unit: 'm3', quantity: 'Volume', valid: [0.1, 1e7] },
    rho: { symbol: 'ρ', unit: 'kg/m3', quantity: 'Density of the air', valid: [0.8, 1.6] },
    X_0: { symbol: 'X_0', unit: '', quantity: 'Oxygen before, by volume', valid: [0.15, 0.21] },
    X_lim: { symbol: 'X_lim', unit: '', quantity: 'Oxygen at which flames go out', valid: [0, 0.18] },
  },
  equation: 'E_O2 = 13.1 ρ V · 0.2314 (1 − X_lim/X_0)',
  sources: [
    { title: 'Peacock & Babrauskas, Fire Safety Journal 17', edition: '1991', locator: '13.1 MJ per kg of oxygen' },
    definition('oxygen balance of a closed volume'),
    recalled('SFPE Handbook of Fire Protection Engineering', 'flames end near 13 to 15 %, in hot layers 10 % or less'),
  ],
  assumptions: [
    'An upper bound: the room expels air as it warms. A lower X_lim means more heat and is the cautious side.',
  ],
  why: 'A closed room starves its fire; opening it feeds the fire again at once.',
  outOfRange: 'refuse',
  outputs: {
    heat: { symbol: 'E_O2', unit: 'MJ', quantity: 'Heat' },
    perVolume: { symbol: 'E_O2/V', unit: 'MJ/m3', quantity: 'Heat per volume' },
  },
  run({ V, rho, X_0, X_lim }) {
    if (X_lim >= X_0) throw new OutOfRangeError('Flames would be out before they start: X_lim is not below X_0.');
    const perVolume = PER_OXYGEN * rho * OXYGEN_IN_AIR * (1 - X_lim / X_0);
    return { heat: perVolume * V, perVolume };
  },
});
