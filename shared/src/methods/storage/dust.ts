import { definition, recalled } from '../sources.ts';
import { defineMethod } from '../define-method.ts';

/** Heat of a layer of combustible dust, MJ. */
export const dustLayer = defineMethod({
  id: 'storage.dust-layer',
  version: 1,
  title: 'Heat of a dust layer',
  symbol: 'Q',
  unit: 'MJ',
  inputs: {
    A: { symbol: 'A', unit: 'm2', quantity: 'Area that is covered', valid: [0, 1e6] },
    d: { symbol: 'δ', unit: 'm', quantity: 'Thickness of the layer', valid: [0, 1] },
    rho: { symbol: 'ρ_b', unit: 'kg/m3', quantity: 'Bulk density', valid: [10, 3000] },
    H: { symbol: 'H_u', unit: 'MJ/kg', quantity: 'Net heat', valid: [0, 150] },
  },
  equation: 'Q = A δ ρ_b H_u',
  sources: [definition('area times thickness times bulk density times heat')],
  assumptions: ['Its heat is small beside what it does when it is whirled up: see the amounts that matter.'],
  why: 'Layers on beams and ducts are in no list of contents.',
  outOfRange: 'refuse',
  run: ({ A, d, rho, H }) => A * d * rho * H,
});

/** Amounts of combustible dust from which on a room counts as one with a dust hazard, kg. */
export const dustThresholds = defineMethod({
  id: 'storage.dust-thresholds',
  version: 1,
  title: 'Amounts of dust that matter',
  symbol: 'M_exp',
  unit: 'kg',
  inputs: {
    A: { symbol: 'A', unit: 'm2', quantity: 'Floor area', valid: [0.1, 1e6] },
    H: { symbol: 'H', unit: 'm', quantity: 'Height of the room', valid: [0.5, 100] },
  },
  equation: 'M_exp = 0.004 A H;  M_fire = 0.02 A',
  sources: [recalled('NFPA 654, Prevention of fire and dust explosions', 'threshold masses')],
  assumptions: [
    'Dust that lies about or can be whirled up, not what is in closed bins.',
    'A layer of 0.8 mm or more on over 5 % of the floor is a finding by itself.',
  ],
  why: 'A spoonful per square metre is enough; megajoules do not show it.',
  outOfRange: 'refuse',
  outputs: {
    explosion: { symbol: 'M_exp', unit: 'kg', quantity: 'Mass for a dust explosion hazard' },
    fire: { symbol: 'M_fire', unit: 'kg', quantity: 'Mass for a dust fire hazard' },
  },
  run: ({ A, H }) => ({ explosion: 0.004 * A * H, fire: 0.02 * A }),
});
