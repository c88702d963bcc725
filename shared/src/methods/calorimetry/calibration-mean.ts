import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { recalled } from '../sources.ts';

const RUNS = 5;
const SPREAD = 0.005;

/** Mean of calibration runs and whether they agree. */
export const calibrationMean = defineMethod({
  id: 'calorimetry.calibration-mean',
  version: 1,
  title: 'Water equivalent of several runs',
  symbol: 'E_m',
  unit: 'MJ/K',
  inputs: { E: { symbol: 'E_i', unit: 'MJ/K', quantity: 'Water equivalent of a run', valid: [1e-6, 1], list: true } },
  equation: 'E_m = Σ E_i/n;  accepted with n ≥ 5 and (E_max − E_min)/E_m ≤ 0.5 %',
  sources: [recalled('EN ISO 1716 and ASTM D240', 'five or more calibration runs, spread 0.2 to 0.5 %')],
  assumptions: [],
  why: 'A calibration that scatters makes every heat scatter.',
  outOfRange: 'refuse',
  outputs: {
    mean: { symbol: 'E_m', unit: 'MJ/K', quantity: 'Mean water equivalent' },
    spread: { symbol: 's', unit: '', quantity: 'Range of the runs over their mean' },
  },
  run({ E }) {
    if (E.length === 0) throw new OutOfRangeError('No calibration run is given.');
    const mean = E.reduce((sum, one) => sum + one, 0) / E.length;
    const spread = (Math.max(...E) - Math.min(...E)) / mean;
    return { mean, spread, accepted: E.length >= RUNS && spread <= SPREAD };
  },
  explain: ({ E }, { accepted }) => [
    { text: accepted ? `${E.length} runs that agree.` : 'Fewer than five runs, or more than 0.5 % apart: run again.' },
  ],
});
