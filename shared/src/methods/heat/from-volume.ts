import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';

/** Heat per mass from heat per volume, MJ/kg. */
export const fromVolume = defineMethod({
  id: 'heat.from-volume',
  version: 1,
  title: 'Heat per kilogram from heat per volume',
  symbol: 'H',
  unit: 'MJ/kg',
  inputs: {
    H_V: { symbol: 'H_V', unit: 'MJ/m3', quantity: 'Heat per volume', valid: [0, 1e7] },
    rho: { symbol: 'ρ', unit: 'kg/m3', quantity: 'Density in the same state', valid: [0.01, 25_000] },
  },
  equation: 'H = H_V/ρ',
  sources: [definition('mass over volume')],
  assumptions: ['Heat and density are for the same temperature and pressure; for gases that decides everything.'],
  why: 'Liquids and gases are sold by volume.',
  outOfRange: 'refuse',
  run: ({ H_V, rho }) => H_V / rho,
});
