import { defineMethod } from '../define-method.ts';
import { definition, recalled } from '../sources.ts';

const SIGMA = 5.670374419e-11;

/** Heat flux from a hot opening or panel, kW/m². */
export const openingRadiation = defineMethod({
  id: 'radiation.opening',
  version: 1,
  title: 'Radiation through an opening',
  symbol: 'q″',
  unit: 'kW/m2',
  inputs: {
    F: { symbol: 'F', unit: '', quantity: 'View factor', valid: [0, 1] },
    epsilon: { symbol: 'ε', unit: '', quantity: 'Emissivity', valid: [0, 1] },
    T: { symbol: 'T', unit: 'K', quantity: 'Temperature of the gas behind it', valid: [250, 1700] },
  },
  equation: 'q″ = F ε σ T⁴',
  sources: [definition('Stefan-Boltzmann law; σ = 5.670·10⁻¹¹ kW/m2K4')],
  assumptions: ['T in kelvin. The opening is taken as black where ε is 1.'],
  why: 'What leaves a window can light what stands opposite.',
  outOfRange: 'refuse',
  run: ({ F, epsilon, T }) => F * epsilon * SIGMA * T ** 4,
});

/** Heat flux opposite an opening by the intensities of boundary-distance practice, kW/m². */
export const boundaryRadiation = defineMethod({
  id: 'radiation.boundary',
  version: 1,
  title: 'Radiation to the next building, boundary practice',
  symbol: 'q″',
  unit: 'kW/m2',
  inputs: {
    F: { symbol: 'F', unit: '', quantity: 'View factor', valid: [0, 1] },
    intensity: { symbol: 'I', quantity: 'Intensity at the openings', choices: ['reduced', 'standard'] },
  },
  equation: 'q″ = F · 84 (reduced) or 168 kW/m2 (standard); compared with 12.6 kW/m2',
  sources: [
    recalled('BR 187, External fire spread', '84 and 168 kW/m2 at the openings, 12.6 at the boundary’s far side'),
  ],
  assumptions: ['Reduced is for low fire loads; which one applies is set by the local rules.'],
  why: 'It is how distances between buildings are set where this practice is followed.',
  outOfRange: 'refuse',
  run: ({ F, intensity }) => F * (intensity === 'reduced' ? 84 : 168),
});
