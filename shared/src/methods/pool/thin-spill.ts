import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

const KJ_PER_MJ = 1000;
const M3_PER_L = 1e-3;

/** Heat release rate and burning time of a thin spill, beside those of a deep pool of the same area. */
export const thinSpill = defineMethod({
  id: 'pool.thin-spill',
  version: 1,
  title: 'Thin spill',
  symbol: 'Q',
  unit: 'kW',
  inputs: {
    burning: { symbol: 'm″', unit: 'kg/m2s', quantity: 'Burning rate of a deep pool', valid: [0.001, 0.3] },
    share: { symbol: 's', unit: '', quantity: 'Share of it that a thin layer reaches', valid: [0.2, 0.3] },
    A: { symbol: 'A', unit: 'm2', quantity: 'Area of the spill', valid: [0.001, 1e6] },
    H: { symbol: 'ΔH_c', unit: 'MJ/kg', quantity: 'Net heat', valid: [1, 125] },
    rho: { symbol: 'ρ', unit: 'kg/m3', quantity: 'Density', valid: [50, 2000] },
    V: { symbol: 'V', unit: 'L', quantity: 'Volume', valid: [0, 1e6] },
  },
  equation: 'Q = s m″ A ΔH_c;  t = V ρ/(s m″ A);  s about 0.2 for layers under 5 to 10 mm',
  sources: [recalled('Gottuk & White, SFPE Handbook of Fire Protection Engineering', 'thin layers burn at 20 to 30 %')],
  assumptions: ['The floor cools the layer. The deep pool is shown beside it as the upper end.'],
  why: 'A thin layer burns slower per area and is gone in a minute.',
  outOfRange: 'refuse',
  outputs: {
    rate: { symbol: 'Q', unit: 'kW', quantity: 'Heat release rate' },
    deepRate: { symbol: 'Q_deep', unit: 'kW', quantity: 'Heat release rate as a deep pool' },
    time: { symbol: 't', unit: 's', quantity: 'Burning time' },
  },
  run({ burning, share, A, H, rho, V }) {
    const deepRate = burning * A * H * KJ_PER_MJ;
    return { rate: share * deepRate, deepRate, time: (V * M3_PER_L * rho) / (share * burning * A) };
  },
});
