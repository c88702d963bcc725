import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { recalled } from '../sources.ts';

/** View factor of a cylinder of flame standing on the ground from a target on the ground, distance from the AXIS. */
export const viewCylinder = defineMethod({
  id: 'radiation.view-cylinder',
  version: 1,
  title: 'View of a cylinder of flame',
  symbol: 'F_max',
  unit: '',
  inputs: {
    L: { symbol: 'L', unit: 'm', quantity: 'Distance from the axis of the flame', valid: [1e-2, 1e4] },
    H: { symbol: 'H', unit: 'm', quantity: 'Flame height', valid: [1e-3, 1000] },
    D: { symbol: 'D', unit: 'm', quantity: 'Diameter', valid: [1e-2, 1000] },
  },
  equation:
    'S = 2L/D, h = 2H/D, A = (h² + S² + 1)/2S, B = (1 + S²)/2S;  F_V = atan(h/√(S²−1))/(πS) − h atan(√((S−1)/(S+1)))/(πS) + A h atan(√((A+1)(S−1)/((A−1)(S+1))))/(πS√(A²−1));  F_H = (B−1/S) atan(√((B+1)(S−1)/((B−1)(S+1))))/(π√(B²−1)) − (A−1/S) atan(√((A+1)(S−1)/((A−1)(S+1))))/(π√(A²−1));  F_max = √(F_V² + F_H²)',
  sources: [
    recalled(
      'Beyler, SFPE Handbook; Mudan, Thermal radiation hazards from hydrocarbon pool fires',
      'vertical cylinder',
    ),
  ],
  assumptions: ['Upright, no wind. L from the axis, not from the edge of the flame.'],
  why: 'Near a pool fire the flame is a body, not a point.',
  outOfRange: 'refuse',
  outputs: {
    vertical: { symbol: 'F_V', unit: '', quantity: 'View factor of a vertical target' },
    horizontal: { symbol: 'F_H', unit: '', quantity: 'View factor of a horizontal target' },
    most: { symbol: 'F_max', unit: '', quantity: 'View factor of the worst direction' },
  },
  run({ L, H, D }) {
    const S = (2 * L) / D;
    if (!(S > 1)) throw new OutOfRangeError('The target stands inside the flame: L is counted from its axis.');
    const h = (2 * H) / D;
    const A = (h * h + S * S + 1) / (2 * S);
    const B = (1 + S * S) / (2 * S);
    const angle = (c: number): number => Math.atan(Math.sqrt(((c + 1) * (S - 1)) / ((c - 1) * (S + 1))));
    const rootA = Math.sqrt(A * A - 1);
    const vertical =
      (Math.atan(h / Math.sqrt(S * S - 1)) -
        h * Math.atan(Math.sqrt((S - 1) / (S + 1))) +
        ((A * h) / rootA) * angle(A)) /
      (Math.PI * S);
    const horizontal = (((B - 1 / S) / Math.sqrt(B * B - 1)) * angle(B) - ((A - 1 / S) / rootA) * angle(A)) / Math.PI;
    return { vertical, horizontal, most: Math.hypot(vertical, horizontal) };
  },
});
