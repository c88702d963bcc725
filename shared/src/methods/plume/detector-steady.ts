import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Time until a sprinkler or heat detector responds in gas of constant temperature, s; null where it never does. */
export const detectorSteady = defineMethod({
  id: 'plume.detector-steady',
  version: 1,
  title: 'Response in a steady ceiling jet',
  symbol: 't_act',
  unit: 's',
  inputs: {
    RTI: { symbol: 'RTI', unit: '(m s)1/2', quantity: 'Response time index', valid: [1, 1000] },
    rise: { symbol: 'ΔT_g', unit: 'K', quantity: 'Rise of the gas', valid: [0, 1500] },
    u: { symbol: 'u', unit: 'm/s', quantity: 'Velocity of the gas', valid: [0, 100] },
    T_a: { symbol: 'T_a', unit: '°C', quantity: 'Temperature before', valid: [-40, 60] },
    T_act: { symbol: 'T_act', unit: '°C', quantity: 'Temperature of response', valid: [40, 350] },
  },
  equation: 't_act = RTI/√u · ln[ΔT_g/(ΔT_g − (T_act − T_a))];  never where ΔT_g ≤ T_act − T_a',
  sources: [recalled('Heskestad & Smith, Investigation of a new sprinkler sensitivity approval test', 'RTI', '1976')],
  assumptions: ['No loss by conduction: real devices are later.'],
  why: 'The closed form against which the general response is held.',
  outOfRange: 'refuse',
  outputs: { time: { symbol: 't_act', unit: 's', quantity: 'Time of response' } },
  run({ RTI, rise, u, T_a, T_act }): { readonly time: number | null } {
    const needed = T_act - T_a;
    if (needed <= 0) return { time: 0 };
    if (rise <= needed || u <= 0) return { time: null };
    return { time: (RTI / Math.sqrt(u)) * -Math.log1p(-needed / rise) };
  },
});
