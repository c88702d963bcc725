import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

const W_PER_KW = 1000;

/** Heat transfer coefficient of a lining at a time, kW/m²K. Layers exposed side first. */
export const liningHeatTransfer = defineMethod({
  id: 'room.lining-heat-transfer',
  version: 1,
  title: 'Heat transfer into a lining',
  symbol: 'h_k',
  unit: 'kW/m2K',
  inputs: {
    t: { symbol: 't', unit: 's', quantity: 'Time of exposure', valid: [1, 86_400] },
    k: { symbol: 'k', unit: 'W/mK', quantity: 'Conductivity', valid: [1e-4, 1000], list: true },
    rho: { symbol: 'ρ', unit: 'kg/m3', quantity: 'Density', valid: [1, 25_000], list: true },
    c: { symbol: 'c', unit: 'J/kgK', quantity: 'Specific heat', valid: [10, 20_000], list: true },
    d: { symbol: 'δ', unit: 'm', quantity: 'Thickness', valid: [1e-5, 10], list: true },
  },
  equation:
    't_p = (ρ c/k)(δ/2)²;  t < t_p: h_k = √(k ρ c/t);  t ≥ t_p: h_k = k/δ, or 1/h_k = δ_1/k_1 + 1/h_2 with another layer behind',
  sources: [
    recalled(
      'McCaffrey, Quintiere & Harkleroad; Karlsson & Quintiere, Enclosure Fire Dynamics',
      'penetration time, h_k',
    ),
  ],
  assumptions: ['One layer is the published rule; a further layer behind it is our extension of it.'],
  why: 'The room relations ask for it in kW/m2K; linings that heat through lose their heat sooner.',
  outOfRange: 'warn',
  outputs: {
    h_k: { symbol: 'h_k', unit: 'kW/m2K', quantity: 'Heat transfer coefficient' },
    t_p: { symbol: 't_p', unit: 's', quantity: 'Penetration time of the exposed layer' },
  },
  run: ({ t, k, rho, c, d }) => ({
    h_k: coefficient(t, k, rho, c, d, 0) / W_PER_KW,
    t_p: penetrationTime(k[0]!, rho[0]!, c[0]!, d[0]!),
  }),
});

function penetrationTime(k: number, rho: number, c: number, d: number): number {
  return ((rho * c) / k) * (d / 2) ** 2;
}

function coefficient(
  t: number,
  k: readonly number[],
  rho: readonly number[],
  c: readonly number[],
  d: readonly number[],
  layer: number,
): number {
  const [ki, rhoi, ci, di] = [k[layer]!, rho[layer]!, c[layer]!, d[layer]!];
  if (t < penetrationTime(ki, rhoi, ci, di)) return Math.sqrt((ki * rhoi * ci) / t);
  if (layer + 1 >= k.length) return ki / di;
  return 1 / (di / ki + 1 / coefficient(t, k, rho, c, d, layer + 1));
}
