import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { recalled } from '../sources.ts';

/** A product that does not burn scatters about 0; below this something was entered wrongly. */
const LOWEST_MJ_KG = -1;

/** Gross heat at constant volume of a sample burnt in a bomb, MJ/kg. */
export const bombGross = defineMethod({
  id: 'calorimetry.bomb-gross',
  version: 1,
  title: 'Gross heat from a bomb run',
  symbol: 'PCS',
  unit: 'MJ/kg',
  inputs: {
    E: { symbol: 'E', unit: 'MJ/K', quantity: 'Water equivalent', valid: [1e-6, 1] },
    T_i: { symbol: 'T_i', unit: '°C', quantity: 'Temperature before', valid: [0, 60] },
    T_m: { symbol: 'T_m', unit: '°C', quantity: 'Highest temperature', valid: [0, 80] },
    c: { symbol: 'c', unit: 'K', quantity: 'Correction for heat exchange, 0 if adiabatic', valid: [-2, 2] },
    b: { symbol: 'b', unit: 'MJ', quantity: 'Fuse, thread and paper', valid: [0, 0.1] },
    m_aid: { symbol: 'm_ba', unit: 'kg', quantity: 'Benzoic acid added to help burning', valid: [0, 0.1] },
    H_aid: { symbol: 'H_c,ba', unit: 'MJ/kg', quantity: 'Heat of the benzoic acid', valid: [26.38, 26.48] },
    m: { symbol: 'm', unit: 'kg', quantity: 'Mass of the sample', valid: [1e-6, 0.1] },
  },
  equation: 'PCS = [E (T_m − T_i + c) − b − m_ba H_c,ba]/m',
  sources: [
    recalled('EN ISO 1716', 'gross heat of combustion'),
    { title: 'ASTM D240', locator: 'form of the relation' },
  ],
  assumptions: ['Constant volume. A product that hardly burns can come out slightly below 0; that stands as measured.'],
  why: 'It is the laboratory’s measurement of what a material holds.',
  outOfRange: 'refuse',
  run({ E, T_i, T_m, c, b, m_aid, H_aid, m }) {
    const rise = T_m - T_i + c;
    if (!(rise > 0))
      throw new OutOfRangeError('The corrected temperature rise is not above 0 K: check T_i, T_m and c.');
    const gross = (E * rise - b - m_aid * H_aid) / m;
    if (gross < LOWEST_MJ_KG)
      throw new OutOfRangeError('Fuse, thread and benzoic acid give more heat than was measured: check E, b and m_ba.');
    return gross;
  },
  explain: ({ E, T_i, T_m, c, b, m_aid, H_aid }) => [
    { text: 'Corrected rise', value: T_m - T_i + c, unit: 'K' },
    { text: 'Heat in the calorimeter', value: E * (T_m - T_i + c), unit: 'MJ' },
    { text: 'Of that fuse, thread, paper and benzoic acid', value: b + m_aid * H_aid, unit: 'MJ' },
  ],
});
