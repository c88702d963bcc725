import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';
import { CURVE_INPUTS } from '../plume/ceiling-inputs.ts';
import { checkCurve } from '../plume/fire-curve.ts';

const KJ_PER_MJ = 1000;

/** When a fire has used up the heat that the air allows, s; null where it has less heat to give. */
export const oxygenEnd = defineMethod({
  id: 'smoke.oxygen-end',
  version: 1,
  title: 'When the air of a closed room is used up',
  symbol: 't_O2',
  unit: 's',
  inputs: {
    ...CURVE_INPUTS,
    E_O2: { symbol: 'E_O2', unit: 'MJ', quantity: 'Heat that the oxygen of the room can feed', valid: [0, 1e9] },
  },
  equation: '∫ Q dt from 0 to t_O2 = E_O2',
  sources: [definition('heat is the area under the curve; straight lines between its points')],
  assumptions: ['The room stays closed. When it is opened the fire is fed again at once and may flare up.'],
  why: 'It turns the heat the air allows into a time on the curve.',
  outOfRange: 'refuse',
  outputs: {
    time: { symbol: 't_O2', unit: 's', quantity: 'Time at which the air is used up' },
    rate: { symbol: 'Q_O2', unit: 'kW', quantity: 'Heat release rate then' },
  },
  run({ t, Q, E_O2 }): { readonly time: number | null; readonly rate: number | null } {
    checkCurve(t, Q);
    let left = E_O2 * KJ_PER_MJ;
    for (let i = 1; i < t.length; i += 1) {
      const span = t[i]! - t[i - 1]!;
      const heat = (span * (Q[i]! + Q[i - 1]!)) / 2;
      if (heat >= left && heat > 0) {
        const slope = (Q[i]! - Q[i - 1]!) / span;
        // Heat of the part of the piece: Q0 x + slope x²/2; the form below does not cancel for small slopes.
        const root = Math.sqrt(Math.max(0, Q[i - 1]! ** 2 + 2 * slope * left));
        const passed = left > 0 ? Math.min(span, (2 * left) / (Q[i - 1]! + root)) : 0;
        return { time: t[i - 1]! + passed, rate: Q[i - 1]! + ((Q[i]! - Q[i - 1]!) * passed) / span };
      }
      left -= heat;
    }
    return { time: null, rate: null };
  },
});
