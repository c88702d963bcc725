import { defineMethod } from '../define-method.ts';
import { en1991 } from '../sources.ts';

/** Load that takes part in a fire as the room is kept: m·q_f,k, without any credit for protection. MJ/m² of floor. */
export const asKept = defineMethod({
  id: 'load.as-kept',
  version: 1,
  title: 'Fire load as kept',
  symbol: 'm·q_f,k',
  unit: 'MJ/m2',
  inputs: {
    m: { symbol: 'm', unit: '', quantity: 'Combustion factor', valid: [0, 1] },
    q_fk: { symbol: 'q_f,k', unit: 'MJ/m2', quantity: 'Characteristic load per floor area', valid: [0, Infinity] },
  },
  equation: 'm · q_f,k',
  sources: [en1991('E.1(3), equation (E.1) with every δ = 1')],
  assumptions: ['No alarm, sprinkler or brigade is credited.'],
  why: 'It is the heat that is there; the design value is smaller or larger by factors made for structural design.',
  outOfRange: 'refuse',
  run: ({ m, q_fk }) => m * q_fk,
});
