import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { recalled } from '../sources.ts';

/** A product that does not burn scatters about 0; below this something was entered wrongly. */
const LOWEST_MJ_KG = -1;

/** Gross heat at constant volume from a bomb run whose sheet gives the corrected temperature rise, MJ/kg. */
export const bombRun = defineMethod({
  id: 'calorimetry.bomb-run',
  version: 1,
  title: 'Gross heat from a bomb run, corrected rise',
  symbol: 'PCS',
  unit: 'MJ/kg',
  inputs: {
    E: { symbol: 'E', unit: 'MJ/K', quantity: 'Water equivalent', valid: [1e-6, 1] },
    dT: { symbol: 'ΔT', unit: 'K', quantity: 'Corrected temperature rise', valid: [1e-3, 20] },
    b: { symbol: 'b', unit: 'MJ', quantity: 'Heat of fuse, thread and paper', valid: [0, 0.1] },
    a: { symbol: 'a', unit: 'MJ', quantity: 'Heat of nitric and sulfuric acid', valid: [0, 0.1] },
    m_aid: { symbol: 'm_ba', unit: 'kg', quantity: 'Mass of benzoic acid added', valid: [0, 0.1] },
    H_aid: { symbol: 'H_c,ba', unit: 'MJ/kg', quantity: 'Heat of the benzoic acid', valid: [26.38, 26.48] },
    m: { symbol: 'm', unit: 'kg', quantity: 'Mass of the sample', valid: [1e-6, 0.1] },
  },
  equation: 'PCS = (E ΔT − b − a − m_ba H_c,ba)/m',
  sources: [
    { title: 'ASTM D240', locator: 'Q = (t W − e1 − e2)/g, acid and fuse as e1 and e2' },
    recalled('EN ISO 1716', 'gross heat of combustion'),
  ],
  assumptions: ['Constant volume. A product that hardly burns can come out slightly below 0; that stands as measured.'],
  why: 'Most laboratory sheets give the rise already corrected for the heat exchanged with the surroundings.',
  outOfRange: 'refuse',
  run({ E, dT, b, a, m_aid, H_aid, m }) {
    const gross = (E * dT - b - a - m_aid * H_aid) / m;
    if (gross < LOWEST_MJ_KG)
      throw new OutOfRangeError(
        'Fuse, acid and benzoic acid give more heat than was measured: check E, ΔT, b, a and m_ba.',
      );
    return gross;
  },
  explain: ({ E, dT, b, a, m_aid, H_aid }) => [
    { text: 'Heat in the calorimeter', value: E * dT, unit: 'MJ' },
    { text: 'Of that fuse, acid and benzoic acid', value: b + a + m_aid * H_aid, unit: 'MJ' },
  ],
});
