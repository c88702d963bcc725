import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { recalled } from '../sources.ts';

const EXPANSION = 1.105;
const OXYGEN_G_MOL = 31.998;
const AIR_G_MOL = 28.8;

/** Heat release rate from oxygen, carbon dioxide and carbon monoxide in the duct, kW. */
export const oxygenCarbon = defineMethod({
  id: 'calorimetry.oxygen-carbon',
  version: 1,
  title: 'Heat release rate from oxygen, CO2 and CO',
  symbol: 'Q',
  unit: 'kW',
  inputs: {
    m_e: { symbol: 'm_e', unit: 'kg/s', quantity: 'Mass flow in the duct', valid: [1e-4, 100] },
    X0_O2: { symbol: 'X0_O2', unit: '', quantity: 'Oxygen before, dry', valid: [0.2, 0.2105] },
    X0_CO2: { symbol: 'X0_CO2', unit: '', quantity: 'Carbon dioxide before, dry', valid: [0, 0.005] },
    X0_H2O: { symbol: 'X0_H2O', unit: '', quantity: 'Water vapour before', valid: [0, 0.1] },
    X_O2: { symbol: 'X_O2', unit: '', quantity: 'Oxygen, dry', valid: [0.05, 0.2105] },
    X_CO2: { symbol: 'X_CO2', unit: '', quantity: 'Carbon dioxide, dry', valid: [0, 0.2] },
    X_CO: { symbol: 'X_CO', unit: '', quantity: 'Carbon monoxide, dry', valid: [0, 0.1] },
    E: { symbol: 'E', unit: 'kJ/kg', quantity: 'Heat per kg of oxygen', valid: [9000, 18_000] },
    E_CO: { symbol: 'E_CO', unit: 'kJ/kg', quantity: 'The same for CO to CO2', valid: [17_000, 18_000] },
  },
  equation:
    'φ = [X0_O2 (1 − X_CO2 − X_CO) − X_O2 (1 − X0_CO2)]/[X0_O2 (1 − X_O2 − X_CO2 − X_CO)];  Q = [E φ − (E_CO − E)(1 − φ)/2 · X_CO/X_O2] m_e/(1 + φ (α − 1)) (M_O2/M_a)(1 − X0_H2O) X0_O2',
  sources: [
    recalled('ISO 9705; Janssens, Measuring rate of heat release by oxygen consumption', 'α = 1.105', '1991'),
    {
      title: 'Peacock & Babrauskas, Fire Safety Journal 17',
      edition: '1991',
      locator: 'E = 13 100, E_CO = 17 600 kJ/kg',
    },
  ],
  assumptions: ['Analysers see dry gas.', 'M_a = 28.8 g/mol.'],
  why: 'It corrects for carbon monoxide, which oxygen alone misreads.',
  outOfRange: 'refuse',
  outputs: {
    depletion: { symbol: 'φ', unit: '', quantity: 'Oxygen depletion factor' },
    rate: { symbol: 'Q', unit: 'kW', quantity: 'Heat release rate' },
  },
  run({ m_e, X0_O2, X0_CO2, X0_H2O, X_O2, X_CO2, X_CO, E, E_CO }) {
    const rest = 1 - X_O2 - X_CO2 - X_CO;
    const depletion = (X0_O2 * (1 - X_CO2 - X_CO) - X_O2 * (1 - X0_CO2)) / (X0_O2 * rest);
    if (depletion < -0.01)
      throw new OutOfRangeError('More oxygen after the fire than before it: check the drift of the analyser.');
    const perOxygen = E * depletion - (((E_CO - E) * (1 - depletion)) / 2) * (X_CO / X_O2);
    if (perOxygen < -0.01 * E)
      throw new OutOfRangeError('More carbon monoxide than the oxygen used up explains: check both analysers.');
    const rate =
      ((perOxygen * m_e) / (1 + depletion * (EXPANSION - 1))) * (OXYGEN_G_MOL / AIR_G_MOL) * (1 - X0_H2O) * X0_O2;
    return { depletion, rate };
  },
});
