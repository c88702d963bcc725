import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';
import { aboveOrigin } from './above-origin.ts';
import { AIR_HEAT_KJ_KGK, AIR_INPUTS, GRAVITY_M_S2, PLUME_INPUTS } from './plume-inputs.ts';

/** Rise on the axis of the plume above the flame, K. */
export const plumeTemperature = defineMethod({
  id: 'plume.temperature',
  version: 1,
  title: 'Temperature on the axis of the plume',
  symbol: 'ΔT_0',
  unit: 'K',
  inputs: { Q_c: PLUME_INPUTS.Q_c, z: PLUME_INPUTS.z, z_0: PLUME_INPUTS.z_0, ...AIR_INPUTS },
  equation: 'ΔT_0 = 9.1 [T_0/(g c_p² ρ_0²)]^(1/3) Q_c^(2/3) (z − z_0)^(−5/3)',
  sources: [recalled('Heskestad, Engineering relations for fire plumes', 'centreline temperature', '1984')],
  assumptions: ['Above the flame, still air, no layer; c_p 1.0 kJ/kgK. Near the flame read it as at most about 900 K.'],
  why: 'Convective rate here, total rate for the flame: mixing them up is the usual slip.',
  outOfRange: 'refuse',
  run: ({ Q_c, z, z_0, T_0, rho_0 }) =>
    9.1 *
    Math.cbrt(T_0 / (GRAVITY_M_S2 * AIR_HEAT_KJ_KGK ** 2 * rho_0 ** 2)) *
    Q_c ** (2 / 3) *
    aboveOrigin(z, z_0) ** (-5 / 3),
});
