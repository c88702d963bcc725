import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Variant, never a default: heat release rate some time after sprinklers opened, kW. */
export const sprinklerLimited = defineMethod({
  id: 'plume.sprinkler-limited',
  version: 1,
  title: 'Rate after sprinklers opened, variant',
  symbol: 'Q',
  unit: 'kW',
  inputs: {
    Q_act: { symbol: 'Q_act', unit: 'kW', quantity: 'Rate when they opened', valid: [0, 1e6] },
    dt: { symbol: 't − t_act', unit: 's', quantity: 'Time since they opened', valid: [0, 86_400] },
    w: { symbol: 'w', unit: 'mm/s', quantity: 'Water density', valid: [0.07, 2] },
    reading: { symbol: '', quantity: 'The fire is taken as', choices: ['decaying', 'held'] },
  },
  equation: 'Q = Q_act e^(−(t − t_act)/τ), τ = 3.0 w^(−1.85);  held: Q = Q_act',
  sources: [recalled('Madrzykowski & Vettori, A sprinkler fire suppression algorithm', 'office furnishings', '1992')],
  assumptions: [
    'Sprinklers work, cover the place and are fit for what burns. Shielded fires do not follow it.',
    'A load that credits sprinklers by δ_n1 must not credit them here as well.',
  ],
  why: 'It shows what is at stake if sprinklers work; the plain curve shows what is at stake if they do not.',
  outOfRange: 'refuse',
  outputs: {
    rate: { symbol: 'Q', unit: 'kW', quantity: 'Heat release rate' },
    timeConstant: { symbol: 'τ', unit: 's', quantity: 'Time constant of the decay' },
  },
  run({ Q_act, dt, w, reading }) {
    const timeConstant = 3 * w ** -1.85;
    return { rate: reading === 'held' ? Q_act : Q_act * Math.exp(-dt / timeConstant), timeConstant };
  },
});
