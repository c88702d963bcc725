import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

const share = (value: number): number => Math.min(1, Math.max(0, value));

/** Height of the smoke layer's lower edge over the room's height while a steady fire fills it. */
export const layerFillingSteady = defineMethod({
  id: 'smoke.layer-filling-steady',
  version: 1,
  title: 'Smoke layer, steady fire',
  symbol: 'z/H',
  unit: '',
  inputs: {
    t: { symbol: 't', unit: 's', quantity: 'Time', valid: [1e-3, 86_400] },
    Q: { symbol: 'Q', unit: 'kW', quantity: 'Heat release rate, constant', valid: [1e-3, 1e6] },
    H: { symbol: 'H', unit: 'm', quantity: 'Height of the room', valid: [0.5, 100] },
    A: { symbol: 'A', unit: 'm2', quantity: 'Floor area', valid: [0.1, 1e6] },
    shape: { symbol: 'A/H²', unit: '', quantity: 'Floor against height', valid: [0.9, 14] },
  },
  equation: 'z/H = 1.11 − 0.28 ln[t Q^(1/3) H^(−4/3)/(A/H²)], between 0 and 1; made for z/H ≥ 0.2',
  sources: [recalled('NFPA 92, Smoke control systems', 'smoke layer, steady fire, no exhaust')],
  assumptions: ['Flat ceiling, no exhaust, fire far from walls. Below z/H 0.2 the layer is taken as down.'],
  why: 'In large rooms people have until the layer reaches them.',
  outOfRange: 'warn',
  run: ({ t, Q, H, A }) => share(1.11 - 0.28 * Math.log((t * Math.cbrt(Q) * H ** (-4 / 3)) / (A / H ** 2))),
});

/** The same for a fire that grows with the square of time. */
export const layerFillingGrowing = defineMethod({
  id: 'smoke.layer-filling-growing',
  version: 1,
  title: 'Smoke layer, growing fire',
  symbol: 'z/H',
  unit: '',
  inputs: {
    t: { symbol: 't', unit: 's', quantity: 'Time', valid: [1e-3, 86_400] },
    t_g: { symbol: 't_g', unit: 's', quantity: 'Time to 1055 kW', valid: [10, 3600] },
    H: { symbol: 'H', unit: 'm', quantity: 'Height of the room', valid: [0.5, 100] },
    A: { symbol: 'A', unit: 'm2', quantity: 'Floor area', valid: [0.1, 1e6] },
    shape: { symbol: 'A/H²', unit: '', quantity: 'Floor against height', valid: [1, 23] },
  },
  equation: 'z/H = 0.91 [t t_g^(−2/5) H^(−4/5) (A/H²)^(−3/5)]^(−1.45), at most 1; made for z/H ≥ 0.2',
  sources: [recalled('NFPA 92, Smoke control systems', 'smoke layer, t-squared fire, no exhaust')],
  assumptions: ['Flat ceiling, no exhaust, fire far from walls; growth of the 1055 kW convention.'],
  why: 'Fires grow; a steady fire fills the room too soon.',
  outOfRange: 'warn',
  run: ({ t, t_g, H, A }) => share(0.91 * (t * t_g ** -0.4 * H ** -0.8 * (A / H ** 2) ** -0.6) ** -1.45),
});
