import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { definition } from '../sources.ts';

/** Heat per mass lost in a furniture or cone calorimeter, MJ/kg. */
export const effectiveHeat = defineMethod({
  id: 'calorimetry.effective-heat',
  version: 1,
  title: 'Effective heat of combustion',
  symbol: 'ΔH_eff',
  unit: 'MJ/kg',
  inputs: {
    Q: { symbol: 'Q', unit: 'MJ', quantity: 'Heat released', valid: [0, 1e7] },
    m_0: { symbol: 'm_0', unit: 'kg', quantity: 'Mass before', valid: [1e-6, 1e6] },
    m_1: { symbol: 'm_1', unit: 'kg', quantity: 'Mass after', valid: [0, 1e6] },
  },
  equation: 'ΔH_eff = Q/(m_0 − m_1)',
  sources: [definition('heat over mass lost')],
  assumptions: ['It contains incomplete combustion already: no factor m and no χ on top of it.'],
  why: 'It is what an item gives in a fire, not what it holds.',
  outOfRange: 'refuse',
  run({ Q, m_0, m_1 }) {
    if (!(m_0 > m_1)) throw new OutOfRangeError('No mass was lost: check the masses before and after.');
    return Q / (m_0 - m_1);
  },
});
