import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';
import { CEILING_INPUTS, CURVE_INPUTS } from './ceiling-inputs.ts';
import { checkCurve, timeAtRate } from './fire-curve.ts';
import { PLACE_FACTOR, rateForRise } from './jet-under-ceiling.ts';

const INDICATOR_K = 13;

/** Indicator for a smoke detector: when the gas at it has risen by 13 K; null where it never does. */
export const smokeIndicator = defineMethod({
  id: 'plume.smoke-indicator',
  version: 1,
  title: 'Indicator for a smoke detector: gas 13 K warmer',
  symbol: 't_13',
  unit: 's',
  inputs: { ...CURVE_INPUTS, ...CEILING_INPUTS },
  equation: 'ΔT(Q(t)) = 13 K with the ceiling jet, solved for t',
  sources: [
    recalled('Heskestad & Delichatsios, Environments of fire detectors', '13 K', '1977'),
    recalled('Alpert, Calculation of response time of ceiling-mounted fire detectors', 'ceiling jet', '1972'),
  ],
  assumptions: ['A stand-in for smoke: what burns, where and how it smoulders can shift it by minutes.'],
  why: 'No relation for smoke itself holds across detectors; this one is simple and says what it is.',
  outOfRange: 'refuse',
  outputs: {
    time: { symbol: 't_13', unit: 's', quantity: 'Time of 13 K' },
    rate: { symbol: 'Q_13', unit: 'kW', quantity: 'Heat release rate that gives 13 K' },
  },
  run({ t, Q, H, r, place }): { readonly time: number | null; readonly rate: number } {
    checkCurve(t, Q);
    const rate = rateForRise(INDICATOR_K, H, r) / PLACE_FACTOR[place];
    return { time: timeAtRate(t, Q, rate), rate };
  },
});
