import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

const KJ_PER_MJ = 1000;
const M3_PER_L = 1e-3;

/** Burning rate, heat release rate and burning time of a contained pool. */
export const poolFire = defineMethod({
  id: 'pool.fire',
  version: 1,
  title: 'Pool fire',
  symbol: 'Q',
  unit: 'kW',
  inputs: {
    rate: { symbol: 'm_∞', unit: 'kg/m2s', quantity: 'Burning rate of a very large pool', valid: [0.001, 0.3] },
    by: { symbol: '', quantity: 'The rate', choices: ['depends-on-diameter', 'is-constant'] },
    kBeta: { symbol: 'kβ', unit: '1/m', quantity: 'Growth with the diameter', valid: [0.1, 10] },
    D: { symbol: 'D', unit: 'm', quantity: 'Diameter; other shapes √(4A/π)', valid: [0.2, 100] },
    H: { symbol: 'ΔH_c', unit: 'MJ/kg', quantity: 'Net heat', valid: [1, 125] },
    rho: { symbol: 'ρ', unit: 'kg/m3', quantity: 'Density', valid: [50, 2000] },
    V: { symbol: 'V', unit: 'L', quantity: 'Volume', valid: [0, 1e7] },
  },
  equation: 'm″ = m_∞ (1 − e^(−kβ D));  Q = m″ A ΔH_c;  t = V ρ/(m″ A)',
  sources: [recalled('Babrauskas, Estimating large pool fire burning rates', 'Fire Technology 19, table', '1983')],
  assumptions: [
    'Deep pool, open air. Alcohols burn independently of D above 0.6 m; “kβ = 100” in reprints is a code for that.',
  ],
  why: 'Liquids do not follow t-squared growth: they burn at once over their surface.',
  outOfRange: 'warn',
  outputs: {
    burning: { symbol: 'm″', unit: 'kg/m2s', quantity: 'Burning rate per area' },
    area: { symbol: 'A', unit: 'm2', quantity: 'Area' },
    rate: { symbol: 'Q', unit: 'kW', quantity: 'Heat release rate' },
    time: { symbol: 't', unit: 's', quantity: 'Burning time' },
  },
  run({ rate, by, kBeta, D, H, rho, V }) {
    const burning = by === 'is-constant' ? rate : rate * -Math.expm1(-kBeta * D);
    const area = (Math.PI * D * D) / 4;
    return {
      burning,
      area,
      rate: burning * area * H * KJ_PER_MJ,
      time: (V * M3_PER_L * rho) / (burning * area),
    };
  },
});
