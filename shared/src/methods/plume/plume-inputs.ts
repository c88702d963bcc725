/** Heat capacity of air, kJ/kgK, and gravity, m/s², as the plume relations take them. */
export const AIR_HEAT_KJ_KGK = 1;
export const GRAVITY_M_S2 = 9.81;

export const PLUME_INPUTS = {
  Q_c: {
    symbol: 'Q_c',
    unit: 'kW',
    quantity: 'Convective heat release rate, 0.6 to 0.7 of the total',
    valid: [1e-3, 1e7],
  },
  z: { symbol: 'z', unit: 'm', quantity: 'Height above the base of the fire', valid: [0, 200] },
  z_0: { symbol: 'z_0', unit: 'm', quantity: 'Virtual origin', valid: [-200, 100] },
  L: { symbol: 'L', unit: 'm', quantity: 'Flame height', valid: [0, 100] },
} as const;

export const AIR_INPUTS = {
  T_0: { symbol: 'T_0', unit: 'K', quantity: 'Temperature of the air', valid: [230, 330] },
  rho_0: { symbol: 'ρ_0', unit: 'kg/m3', quantity: 'Density of the air', valid: [0.8, 1.6] },
} as const;
