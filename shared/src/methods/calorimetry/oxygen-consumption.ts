import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { recalled } from '../sources.ts';

/** Heat release rate from oxygen alone behind an orifice, kW and kW/m². */
export const oxygenConsumption = defineMethod({
  id: 'calorimetry.oxygen-consumption',
  version: 1,
  title: 'Heat release rate from oxygen consumption',
  symbol: 'q',
  unit: 'kW',
  inputs: {
    E: { symbol: 'Δh_c/r_0', unit: 'kJ/kg', quantity: 'Heat per kg of oxygen', valid: [9000, 18_000] },
    C: { symbol: 'C', unit: 'm1/2kg1/2K1/2', quantity: 'Orifice constant', valid: [0.01, 0.1] },
    dp: { symbol: 'Δp', unit: 'Pa', quantity: 'Pressure difference at the orifice', valid: [0, 5000] },
    T_e: { symbol: 'T_e', unit: 'K', quantity: 'Gas temperature at the orifice', valid: [250, 1000] },
    X_0: { symbol: 'X0_O2', unit: '', quantity: 'Oxygen before, dry', valid: [0.2, 0.2105] },
    X: { symbol: 'X_O2', unit: '', quantity: 'Oxygen, dry', valid: [0.1, 0.2105] },
    A: { symbol: 'A_s', unit: 'm2', quantity: 'Exposed area of the specimen', valid: [1e-4, 100] },
  },
  equation: 'q = Δh_c/r_0 · 1.10 · C √(Δp/T_e) (X0 − X)/(1.105 − 1.5 X)',
  sources: [
    recalled('ISO 5660-1 and ASTM E1354', 'cone calorimeter; A_s = 0.008836 m2 with frame, 0.01 without'),
    { title: 'Peacock & Babrauskas, Fire Safety Journal 17', edition: '1991', locator: '13 100 kJ/kg of oxygen' },
  ],
  assumptions: ['Water and carbon dioxide are trapped before the analyser; no correction for carbon monoxide.'],
  why: 'It is how cone calorimeters measure.',
  outOfRange: 'refuse',
  outputs: {
    rate: { symbol: 'q', unit: 'kW', quantity: 'Heat release rate' },
    perArea: { symbol: 'q″', unit: 'kW/m2', quantity: 'Heat release rate per area' },
  },
  run({ E, C, dp, T_e, X_0, X, A }) {
    if (X > X_0 + 1e-3)
      throw new OutOfRangeError('More oxygen after the fire than before it: check the drift of the analyser.');
    const rate = (E * 1.1 * C * Math.sqrt(dp / T_e) * (X_0 - X)) / (1.105 - 1.5 * X);
    return { rate, perArea: rate / A };
  },
});
