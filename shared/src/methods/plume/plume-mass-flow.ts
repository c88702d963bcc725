import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';
import { aboveOrigin } from './above-origin.ts';
import { PLUME_INPUTS } from './plume-inputs.ts';

/** Mass that rises in the plume, kg/s, above and inside the flame. */
export const plumeMassFlow = defineMethod({
  id: 'plume.mass-flow',
  version: 1,
  title: 'Mass flow of the plume',
  symbol: 'm_p',
  unit: 'kg/s',
  inputs: PLUME_INPUTS,
  equation: 'z > L: m_p = 0.071 Q_c^(1/3) (z − z_0)^(5/3) + 0.00192 Q_c;  z ≤ L: m_p = 0.0056 Q_c z/L',
  sources: [recalled('Heskestad, Engineering relations for fire plumes', 'mass flow', '1984')],
  assumptions: ['Convective rate; free plume.'],
  why: 'It is the smoke that has to leave.',
  outOfRange: 'refuse',
  run: ({ Q_c, z, z_0, L }) =>
    z > L
      ? 0.071 * Math.cbrt(Q_c) * aboveOrigin(z, z_0) ** (5 / 3) + 0.00192 * Q_c
      : L > 0
        ? (0.0056 * Q_c * z) / L
        : 0,
});
