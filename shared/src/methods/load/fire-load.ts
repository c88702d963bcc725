import { defineMethod } from '../define-method.ts';
import { figure } from '../figure.ts';
import { en1991, italianDecree } from '../sources.ts';

const SHOWN = 40;

/** Heat kept in a room: count × mass × net heat × enclosure factor, summed over parts. Negative input is refused. */
export const fireLoad = defineMethod({
  id: 'load.fire-load',
  version: 1,
  title: 'Fire load',
  symbol: 'Q_fi,k',
  unit: 'MJ',
  inputs: {
    n: { symbol: 'n', unit: '', quantity: 'Number of pieces', valid: [0, 1e6], list: true },
    M: { symbol: 'M_k,i', unit: 'kg', quantity: 'Mass of one piece', valid: [0, 1e6], list: true },
    H: { symbol: 'H_u,i', unit: 'MJ/kg', quantity: 'Net heat, as received', valid: [0, 150], list: true },
    psi: { symbol: 'ψ_i', unit: '', quantity: 'Enclosure factor', valid: [0, 1], list: true },
  },
  equation: 'Q_fi,k = Σ n · M_k,i · H_u,i · ψ_i',
  sources: [en1991('E.2.1, equation (E.2)'), italianDecree('annex, point 2: q = Σ g H m ψ')],
  assumptions: ['Everything burns completely; what does not is in the combustion factor m, not here.'],
  why: 'The sum of mass times heat is the definition every code shares; it needs nothing but the survey.',
  outOfRange: 'refuse',
  run({ n, M, H, psi }) {
    let sum = 0;
    for (let i = 0; i < n.length; i += 1) sum += n[i]! * M[i]! * H[i]! * psi[i]!;
    return sum;
  },
  explain({ n, M, H, psi }) {
    const steps = n.slice(0, SHOWN).map((count, i) => ({
      text: `${figure(count)} × ${figure(M[i]!)} kg × ${figure(H[i]!)} MJ/kg × ψ ${figure(psi[i]!)}`,
      value: count * M[i]! * H[i]! * psi[i]!,
      unit: 'MJ',
    }));
    return n.length <= SHOWN ? steps : [...steps, { text: `and ${n.length - SHOWN} more parts` }];
  },
});
