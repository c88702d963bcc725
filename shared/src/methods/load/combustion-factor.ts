import { defineMethod } from '../define-method.ts';
import { dbSi, en1991, italianDecree } from '../sources.ts';

/** Combustion factor of a room: the factors of its materials weighted by their heat. No heat at all: 1. */
export const combustionFactor = defineMethod({
  id: 'load.combustion-factor',
  version: 1,
  title: 'Combustion factor',
  symbol: 'm',
  unit: '',
  inputs: {
    m: { symbol: 'm_i', unit: '', quantity: 'Combustion factor of a part', valid: [0, 1], list: true },
    Q: { symbol: 'Q_i', unit: 'MJ', quantity: 'Heat of the part', valid: [0, Infinity], list: true },
  },
  equation: 'm = Σ m_i Q_i / Σ Q_i',
  sources: [
    en1991('E.3: 0.8 for mainly cellulosic materials'),
    italianDecree('annex, point 2: m 0.80 wood and cellulose, 1.00 others'),
    dbSi('B.4: m = 0.8 cellulosic'),
  ],
  assumptions: [
    'Cellulosic materials 0.8, all others 1.0.',
    'A heat measured as it burns (effective) already contains the factor and takes 1.',
  ],
  why: '0.8 for everything would understate plastics and liquids by a fifth; weighting by heat keeps each at its own.',
  outOfRange: 'refuse',
  run({ m, Q }) {
    let weighted = 0;
    let sum = 0;
    for (let i = 0; i < Q.length; i += 1) {
      weighted += m[i]! * Q[i]!;
      sum += Q[i]!;
    }
    return sum > 0 ? weighted / sum : 1;
  },
});
