import { defineMethod } from '../define-method.ts';
import { definition, recalled } from '../sources.ts';
import { CEILING_INPUTS, CURVE_INPUTS } from './ceiling-inputs.ts';
import { checkCurve } from './fire-curve.ts';
import { heatDevice, type Response } from './heated-device.ts';
import { PLACE_FACTOR } from './jet-under-ceiling.ts';

/** When a sprinkler or heat detector under the ceiling responds to a fire of any curve; null where it never does. */
export const detectorResponse = defineMethod({
  id: 'plume.detector-response',
  version: 1,
  title: 'Response of a sprinkler or heat detector',
  symbol: 't_act',
  unit: 's',
  inputs: {
    ...CURVE_INPUTS,
    ...CEILING_INPUTS,
    RTI: { symbol: 'RTI', unit: '(m s)1/2', quantity: 'Response time index', valid: [1, 1000] },
    T_a: { symbol: 'T_a', unit: '°C', quantity: 'Temperature before', valid: [-40, 60] },
    T_act: { symbol: 'T_act', unit: '°C', quantity: 'Temperature of response', valid: [40, 350] },
  },
  equation: 'dT_d/dt = √u (T_g − T_d)/RTI with the ceiling jet of Q(t)',
  sources: [
    recalled('Heskestad & Smith, Investigation of a new sprinkler sensitivity approval test', 'RTI', '1976'),
    recalled('Alpert, Calculation of response time of ceiling-mounted fire detectors', 'ceiling jet', '1972'),
    definition('adaptive steps, error below 0.0001 K each'),
  ],
  assumptions: [
    'The gas follows the fire at once; no hot layer; no loss by conduction, so real devices are later.',
    'RTI fast 28 to 50, standard 80 to 350 (m s)1/2. A sheet in (ft s)1/2 is converted first.',
    'The curve ends with its last point.',
  ],
  why: 'Fires grow; a steady jet would respond too early or never.',
  outOfRange: 'refuse',
  outputs: {
    time: { symbol: 't_act', unit: 's', quantity: 'Time of response' },
    rate: { symbol: 'Q_act', unit: 'kW', quantity: 'Heat release rate then' },
    hottest: { symbol: 'ΔT_d', unit: 'K', quantity: 'Highest rise of the device' },
  },
  run({ t, Q, H, r, place, RTI, T_a, T_act }): Response {
    checkCurve(t, Q);
    const needed = T_act - T_a;
    if (needed <= 0) return { time: t[0]!, rate: Q[0]!, hottest: 0 };
    return heatDevice(t, Q, { rti: RTI, needed, height: H, radius: r, factor: PLACE_FACTOR[place] });
  },
});
