import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { recalled } from '../sources.ts';

const RUNS = 3;
const LOW_HEAT = 3.2;
const LOW_RANGE = 0.2;
const SHARE = 0.05;

/** Mean of bomb runs and whether they agree well enough to be used. */
export const bombAcceptance = defineMethod({
  id: 'calorimetry.bomb-acceptance',
  version: 1,
  title: 'Bomb runs taken together',
  symbol: 'PCS_m',
  unit: 'MJ/kg',
  inputs: { PCS: { symbol: 'PCS_i', unit: 'MJ/kg', quantity: 'Gross heat of a run', valid: [-1, 150], list: true } },
  equation: 'three runs; range ≤ 0.2 MJ/kg where PCS_m ≤ 3.2 MJ/kg, else ≤ 5 % of PCS_m',
  sources: [recalled('EN ISO 1716', 'validity of test results')],
  assumptions: ['For textiles and uneven products laboratories allow more; that needs a note.'],
  why: 'One run can be wrong without showing it.',
  outOfRange: 'refuse',
  outputs: {
    mean: { symbol: 'PCS_m', unit: 'MJ/kg', quantity: 'Mean gross heat' },
    range: { symbol: 'R', unit: 'MJ/kg', quantity: 'Highest less lowest run' },
    allowed: { symbol: 'R_max', unit: 'MJ/kg', quantity: 'Range allowed' },
  },
  run({ PCS }) {
    if (PCS.length === 0) throw new OutOfRangeError('No bomb run is given.');
    const mean = PCS.reduce((sum, one) => sum + one, 0) / PCS.length;
    const range = Math.max(...PCS) - Math.min(...PCS);
    const allowed = mean <= LOW_HEAT ? LOW_RANGE : SHARE * mean;
    return { mean, range, allowed, accepted: PCS.length >= RUNS && range <= allowed };
  },
  explain: ({ PCS }, { accepted }) => [
    { text: accepted ? `${PCS.length} runs that agree.` : 'Fewer than three runs, or too far apart: run again.' },
  ],
});
