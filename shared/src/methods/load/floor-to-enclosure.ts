import { defineMethod } from '../define-method.ts';
import { en1991 } from '../sources.ts';

/** Load per enclosing area from load per floor area, MJ/m². */
export const floorToEnclosure = defineMethod({
  id: 'load.floor-to-enclosure',
  version: 1,
  title: 'Load per enclosing area for the burn-out',
  symbol: 'q_t,d',
  unit: 'MJ/m2',
  inputs: {
    q_fd: { symbol: 'q_f,d', unit: 'MJ/m2', quantity: 'Load per floor area', valid: [0, Infinity] },
    A_f: { symbol: 'A_f', unit: 'm2', quantity: 'Floor area', valid: [1e-6, Infinity] },
    A_t: { symbol: 'A_t', unit: 'm2', quantity: 'Enclosing area, openings included', valid: [1e-6, Infinity] },
  },
  equation: 'q_t,d = q_f,d · A_f / A_t',
  sources: [en1991('Annex A(9)')],
  assumptions: ['A_t contains the openings.'],
  why: 'The parametric curve is written in load per enclosing area.',
  outOfRange: 'refuse',
  run: ({ q_fd, A_f, A_t }) => (q_fd * A_f) / A_t,
});
