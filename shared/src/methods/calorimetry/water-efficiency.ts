import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';

/** Heat per burnt mass that a water calorimeter saw, and its share of the known net heat. */
export const waterEfficiency = defineMethod({
  id: 'calorimetry.water-efficiency',
  version: 1,
  title: 'Share of the heat that a water calorimeter catches',
  symbol: 'η',
  unit: '',
  inputs: {
    Q: { symbol: 'Q', unit: 'kJ', quantity: 'Heat taken up', valid: [0, 1e9] },
    m: { symbol: 'm', unit: 'g', quantity: 'Fuel burnt', valid: [1e-3, 1e6] },
    H: { symbol: 'H_net', unit: 'MJ/kg', quantity: 'Net heat of the fuel', valid: [0.1, 150] },
  },
  equation: 'H = Q/m;  η = H/H_net',
  sources: [definition('heat balance')],
  assumptions: ['Without a jacket 40 to 80 % is usual.'],
  why: 'It shows how much an open calorimeter misses before its value is used for anything else.',
  outOfRange: 'refuse',
  outputs: {
    heat: { symbol: 'H', unit: 'MJ/kg', quantity: 'Heat per burnt mass' },
    efficiency: { symbol: 'η', unit: '', quantity: 'Share of the net heat' },
  },
  run: ({ Q, m, H }) => ({ heat: Q / m, efficiency: Q / m / H }),
});
