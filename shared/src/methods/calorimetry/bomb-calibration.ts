import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Water equivalent of a bomb calorimeter from one run with benzoic acid, MJ/K. */
export const bombCalibration = defineMethod({
  id: 'calorimetry.bomb-calibration',
  version: 1,
  title: 'Water equivalent of a bomb calorimeter',
  symbol: 'E',
  unit: 'MJ/K',
  inputs: {
    m: { symbol: 'm_ba', unit: 'kg', quantity: 'Mass of benzoic acid', valid: [1e-5, 0.1] },
    H: { symbol: 'H_c,ba', unit: 'MJ/kg', quantity: 'Certified heat of the benzoic acid', valid: [26.38, 26.48] },
    b: { symbol: 'b', unit: 'MJ', quantity: 'Fuse, thread and paper', valid: [0, 0.01] },
    dT: { symbol: 'ΔT', unit: 'K', quantity: 'Corrected temperature rise', valid: [0.01, 20] },
  },
  equation: 'E = (m_ba H_c,ba + b)/ΔT',
  sources: [
    { title: 'ASTM D240', locator: 'W = (Q g + e1 + e2)/t' },
    { title: 'NIST certificate SRM 39j, benzoic acid', locator: '26 434 ± 3 J/g for mass in vacuum' },
    recalled('EN ISO 1716', 'calibration'),
  ],
  assumptions: [
    '26.434 MJ/kg goes with mass in vacuum, 26.454 with weight in air against brass; the constant-pressure 26.42 is neither.',
  ],
  why: 'Every later run is measured against it.',
  outOfRange: 'refuse',
  run: ({ m, H, b, dT }) => (m * H + b) / dT,
});
