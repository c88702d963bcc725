import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

const W_PER_KW = 1000;
/** Below this K1 √t the first terms of the series are more exact than the difference. */
const SMALL = 1e-4;

/** Rise of the gas in a closed room with a small leak at a constant heat release rate after Beyler, K. */
export const closedRoom = defineMethod({
  id: 'temperature.closed-room',
  version: 1,
  title: 'Gas temperature in a closed room, Beyler',
  symbol: 'ΔT',
  unit: 'K',
  inputs: {
    Q: { symbol: 'Q', unit: 'kW', quantity: 'Heat release rate, constant', valid: [0, 1e6] },
    t: { symbol: 't', unit: 's', quantity: 'Time', valid: [0, 86_400] },
    k: { symbol: 'k', unit: 'W/mK', quantity: 'Conductivity of the lining', valid: [1e-4, 1000] },
    rho: { symbol: 'ρ', unit: 'kg/m3', quantity: 'Density of the lining', valid: [1, 25_000] },
    c: { symbol: 'c', unit: 'J/kgK', quantity: 'Heat capacity of the lining', valid: [10, 20_000] },
    A_T: { symbol: 'A_T', unit: 'm2', quantity: 'Lining area', valid: [1e-3, 1e6] },
    m: { symbol: 'm', unit: 'kg', quantity: 'Mass of the gas in the room', valid: [1e-2, 1e7] },
    c_p: { symbol: 'c_p', unit: 'kJ/kgK', quantity: 'Heat capacity of air', valid: [0.9, 1.2] },
  },
  equation: 'ΔT = (2 K2/K1²)(K1 √t − 1 + e^(−K1 √t));  K1 = 2 · 0.4 √(k ρ c) A_T/(m c_p);  K2 = Q/(m c_p)',
  sources: [
    recalled(
      'Beyler, Analysis of compartment fires with overhead forced ventilation and closed rooms',
      'closed room',
      '1991',
    ),
  ],
  assumptions: [
    'Constant rate; a small leak keeps the pressure; thick linings.',
    'It ends where the oxygen ends: see the heat that the oxygen of the room can feed.',
  ],
  why: 'With every opening closed the natural relation has nothing to work with.',
  outOfRange: 'refuse',
  outputs: {
    rise: { symbol: 'ΔT', unit: 'K', quantity: 'Rise of the gas' },
    K1: { symbol: 'K1', unit: 's-1/2', quantity: 'Loss to the linings' },
    K2: { symbol: 'K2', unit: 'K/s', quantity: 'Rise per second without loss' },
  },
  run({ Q, t, k, rho, c, A_T, m, c_p }) {
    const K1 = (2 * 0.4 * (Math.sqrt(k * rho * c) / W_PER_KW) * A_T) / (m * c_p);
    const K2 = Q / (m * c_p);
    const x = K1 * Math.sqrt(t);
    const rise = x < SMALL ? K2 * t * (1 - x / 3) : ((2 * K2) / (K1 * K1)) * (x + Math.expm1(-x));
    return { rise, K1, K2 };
  },
});
