import { defineMethod } from '../define-method.ts';

/** Heat per weight in air from heat per mass in vacuum; the unit of the value is kept. */
export const airBuoyancy = defineMethod({
  id: 'calorimetry.air-buoyancy',
  version: 1,
  title: 'Heat per weight in air',
  symbol: 'H_air',
  unit: 'MJ/kg',
  inputs: {
    H_vac: { symbol: 'H_vac', unit: 'MJ/kg', quantity: 'Heat per mass in vacuum', valid: [0, 150] },
    rho_s: { symbol: 'ρ_s', unit: 'g/cm3', quantity: 'Density of the sample', valid: [0.01, 20] },
    rho_w: { symbol: 'ρ_w', unit: 'g/cm3', quantity: 'Density of the weights', valid: [1, 22] },
    rho_a: { symbol: 'ρ_a', unit: 'g/cm3', quantity: 'Density of air', valid: [0.0008, 0.0015] },
  },
  equation: 'H_air = H_vac [1 + ρ_a (1/ρ_s − 1/ρ_w)]',
  sources: [
    { title: 'NIST certificate SRM 39j, benzoic acid', locator: '26 434 J/g in vacuum' },
    {
      title: 'Certificate of commercial benzoic acid',
      locator: '26 454 J/g weighed in air against brass of 8.4 g/cm3',
    },
  ],
  assumptions: ['Weights were adjusted in vacuum.'],
  why: 'It explains the 0.08 % between two certified values of the same substance.',
  outOfRange: 'refuse',
  run: ({ H_vac, rho_s, rho_w, rho_a }) => H_vac * (1 + rho_a * (1 / rho_s - 1 / rho_w)),
});
