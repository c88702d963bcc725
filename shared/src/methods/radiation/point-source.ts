import { defineMethod } from '../define-method.ts';
import { definition, recalled } from '../sources.ts';

/** Heat flux at a distance from a fire taken as a point, kW/m². */
export const pointSource = defineMethod({
  id: 'radiation.point-source',
  version: 1,
  title: 'Radiation of a point source',
  symbol: 'q″',
  unit: 'kW/m2',
  inputs: {
    Q: { symbol: 'Q', unit: 'kW', quantity: 'Heat release rate', valid: [0, 1e7] },
    chi_r: { symbol: 'χ_r', unit: '', quantity: 'Radiative fraction', valid: [0, 0.65] },
    R: { symbol: 'R', unit: 'm', quantity: 'Distance from the middle of the flame', valid: [0.05, 1000] },
    ratio: { symbol: 'R/D', unit: '', quantity: 'Distance against diameter', valid: [2.5, 1e6] },
  },
  equation: 'q″ = χ_r Q/(4 π R²)',
  sources: [
    definition('power over the sphere of radius R'),
    recalled(
      'SFPE Handbook of Fire Protection Engineering',
      'to about 5 kW/m2 or R/D > 2.5; safety factor 2 for design',
    ),
  ],
  assumptions: ['The target faces the flame; nothing shades it. R counts from the middle of the flame’s height.'],
  why: 'Compared with measured fluxes it is the most robust of the simple relations.',
  outOfRange: 'warn',
  run: ({ Q, chi_r, R }) => (chi_r * Q) / (4 * Math.PI * R * R),
});
