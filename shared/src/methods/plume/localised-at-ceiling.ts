import { defineMethod } from '../define-method.ts';
import { en1991 } from '../sources.ts';

const MOST_W_M2 = 100_000;
const SCALE_W = 1.11e6;

/** Heat flux a ceiling receives from a fire whose flame reaches it, W/m². Fluxes of several fires add up to 100 000. */
export const localisedAtCeiling = defineMethod({
  id: 'plume.localised-at-ceiling-2002',
  version: 1,
  title: 'Localised fire, flame at the ceiling',
  symbol: 'h',
  unit: 'W/m2',
  inputs: {
    Q: { symbol: 'Q', unit: 'W', quantity: 'Heat release rate', valid: [1, 50e6] },
    D: { symbol: 'D', unit: 'm', quantity: 'Diameter of the fire', valid: [0.01, 10] },
    H: { symbol: 'H', unit: 'm', quantity: 'Ceiling above the fire', valid: [0.1, 50] },
    r: { symbol: 'r', unit: 'm', quantity: 'Distance from the axis along the ceiling', valid: [0, 100] },
  },
  equation:
    'Q*_H = Q/(1.11·10⁶ H^2.5);  L_h = 2.9 H (Q*_H)^0.33 − H;  Q*_D = Q/(1.11·10⁶ D^2.5);  z′ = 2.4 D (Q*_D^(2/5) − Q*_D^(2/3)), Q*_D < 1, else 2.4 D (1 − Q*_D^(2/5));  y = (r + H + z′)/(L_h + H + z′);  h = 100 000 (y ≤ 0.3), 136 300 − 121 000 y, 15 000 y^(−3.7) (y ≥ 1)',
  sources: [en1991('Annex C, equations (C.4) to (C.8), after Hasemi')],
  assumptions: ['For a flame that reaches the ceiling. Flux to a cold surface.'],
  why: 'Beams right above a stack see more than any room average.',
  outOfRange: 'refuse',
  outputs: {
    flame: { symbol: 'L_h', unit: 'm', quantity: 'Flame along the ceiling' },
    origin: { symbol: 'z′', unit: 'm', quantity: 'Virtual source below the fire' },
    flux: { symbol: 'h', unit: 'W/m2', quantity: 'Heat flux' },
  },
  run({ Q, D, H, r }) {
    const flame = Math.max(0, 2.9 * H * (Q / (SCALE_W * H ** 2.5)) ** 0.33 - H);
    const q = Q / (SCALE_W * D ** 2.5);
    const origin = q < 1 ? 2.4 * D * (q ** 0.4 - q ** (2 / 3)) : 2.4 * D * (1 - q ** 0.4);
    const reach = flame + H + origin;
    const y = reach > 0 ? (r + H + origin) / reach : 0;
    const flux = y <= 0.3 ? MOST_W_M2 : y < 1 ? 136_300 - 121_000 * y : 15_000 * y ** -3.7;
    return { flame, origin, flux: Math.min(MOST_W_M2, flux) };
  },
  explain: ({ Q, D }) => [{ text: 'Q*_D', value: Q / (SCALE_W * D ** 2.5), unit: '' }],
});
