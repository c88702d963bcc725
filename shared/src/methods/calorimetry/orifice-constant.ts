import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { definition, recalled } from '../sources.ts';

const METHANE_KJ_KG = 12_540;
const USUAL = [0.04, 0.046] as const;

/** Orifice constant of a cone calorimeter from a methane burner of known rate. */
export const orificeConstant = defineMethod({
  id: 'calorimetry.orifice-constant',
  version: 1,
  title: 'Orifice constant from a methane burner',
  symbol: 'C',
  unit: 'm1/2kg1/2K1/2',
  inputs: {
    q_b: { symbol: 'q_b', unit: 'kW', quantity: 'Rate of the burner', valid: [0.1, 20] },
    dp: { symbol: 'Δp', unit: 'Pa', quantity: 'Pressure difference at the orifice', valid: [1, 5000] },
    T_e: { symbol: 'T_e', unit: 'K', quantity: 'Gas temperature at the orifice', valid: [250, 1000] },
    X_0: { symbol: 'X0_O2', unit: '', quantity: 'Oxygen before, dry', valid: [0.2, 0.2105] },
    X: { symbol: 'X_O2', unit: '', quantity: 'Oxygen, dry', valid: [0.1, 0.2105] },
  },
  equation: 'C = q_b/(12.54·10³ · 1.10) √(T_e/Δp) (1.105 − 1.5 X)/(X0 − X)',
  sources: [
    recalled('ISO 5660-1', 'calibration with methane, 5 kW; C about 0.04 to 0.045'),
    definition('12.54 MJ per kg of oxygen for methane, from enthalpies of formation'),
  ],
  assumptions: ['Outside 0.040 to 0.046 a reading is wrong, most often the oxygen.'],
  why: 'A wrong constant scales every rate of the instrument.',
  outOfRange: 'refuse',
  outputs: { constant: { symbol: 'C', unit: 'm1/2kg1/2K1/2', quantity: 'Orifice constant' } },
  run({ q_b, dp, T_e, X_0, X }) {
    if (!(X_0 - X > 1e-5)) throw new OutOfRangeError('The burner used up no oxygen: check the analyser.');
    const constant = ((q_b / (METHANE_KJ_KG * 1.1)) * Math.sqrt(T_e / dp) * (1.105 - 1.5 * X)) / (X_0 - X);
    return { constant, plausible: constant >= USUAL[0] && constant <= USUAL[1] };
  },
  explain: (_inputs, { plausible }) =>
    plausible ? [] : [{ text: 'Outside 0.040 to 0.046: check the oxygen reading before this constant is used.' }],
});
