import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';
import { aboveOrigin } from './above-origin.ts';
import { AIR_HEAT_KJ_KGK, AIR_INPUTS, GRAVITY_M_S2, PLUME_INPUTS } from './plume-inputs.ts';

/** Velocity on the axis of the plume above the flame, m/s. */
export const plumeVelocity = defineMethod({
  id: 'plume.velocity',
  version: 1,
  title: 'Velocity on the axis of the plume',
  symbol: 'u_0',
  unit: 'm/s',
  inputs: { Q_c: PLUME_INPUTS.Q_c, z: PLUME_INPUTS.z, z_0: PLUME_INPUTS.z_0, ...AIR_INPUTS },
  equation: 'u_0 = 3.4 [g/(c_p ρ_0 T_0)]^(1/3) Q_c^(1/3) (z − z_0)^(−1/3)',
  sources: [recalled('Heskestad, Engineering relations for fire plumes', 'centreline velocity', '1984')],
  assumptions: ['Above the flame, still air; c_p 1.0 kJ/kgK.'],
  why: 'It carries smoke to the ceiling and heat to a detector.',
  outOfRange: 'refuse',
  run: ({ Q_c, z, z_0, T_0, rho_0 }) =>
    3.4 * Math.cbrt(((GRAVITY_M_S2 / (AIR_HEAT_KJ_KGK * rho_0 * T_0)) * Q_c) / aboveOrigin(z, z_0)),
});
