import { defineMethod } from '../define-method.ts';
import { figure } from '../figure.ts';
import { en1991 } from '../sources.ts';

interface ThermalInertia {
  /** J/m²s^½K */
  readonly b: number;
  /** Thickness of the exposed layer that matters, m; 0 where it does not. */
  readonly limit: number;
}

/** Thermal inertia of a surface of one or two layers, exposed side first; further layers are not used. */
export const thermalInertia = defineMethod({
  id: 'burnout.thermal-inertia-2002',
  version: 1,
  title: 'Thermal inertia of a surface',
  symbol: 'b',
  unit: 'J/m2s1/2K',
  inputs: {
    t_max: { symbol: 't_max', unit: 'h', quantity: 'Time of the highest temperature', valid: [1e-6, 1000] },
    s: { symbol: 's', unit: 'm', quantity: 'Thickness', valid: [1e-5, 10], list: true },
    rho: { symbol: 'ρ', unit: 'kg/m3', quantity: 'Density', valid: [1, 25_000], list: true },
    c: { symbol: 'c', unit: 'J/kgK', quantity: 'Specific heat', valid: [10, 20_000], list: true },
    lambda: { symbol: 'λ', unit: 'W/mK', quantity: 'Conductivity', valid: [1e-4, 1000], list: true },
  },
  equation:
    'b = √(ρ c λ); b_1 < b_2: b = b_1; else s_lim = √(3600 t_max λ_1/(c_1 ρ_1)); s_1 > s_lim: b = b_1; else b = (s_1/s_lim) b_1 + (1 − s_1/s_lim) b_2',
  sources: [en1991('Annex A(5)-(7), equations (A.3) to (A.4b)')],
  assumptions: ['Layer 1 is the exposed one.', 'Values at room temperature.'],
  why: 'It belongs to the parametric curve and the conversion factor k_b.',
  outOfRange: 'warn',
  outputs: { b: { symbol: 'b', unit: 'J/m2s1/2K', quantity: 'Thermal inertia' } },
  run({ t_max, s, rho, c, lambda }): ThermalInertia {
    const b1 = Math.sqrt(rho[0]! * c[0]! * lambda[0]!);
    if (s.length < 2) return { b: b1, limit: 0 };
    const b2 = Math.sqrt(rho[1]! * c[1]! * lambda[1]!);
    if (b1 <= b2) return { b: b1, limit: 0 };
    const limit = Math.sqrt((3600 * t_max * lambda[0]!) / (c[0]! * rho[0]!));
    const share = s[0]! / limit;
    return { b: share >= 1 ? b1 : share * b1 + (1 - share) * b2, limit };
  },
  explain: (_inputs, { limit }) =>
    limit > 0 ? [{ text: `Thickness that matters s_lim = ${figure(limit)} m`, value: limit, unit: 'm' }] : [],
});
