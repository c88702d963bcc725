import { defineMethod } from '../define-method.ts';
import { definition, recalled } from '../sources.ts';

const CO_KG_MOL = 0.02801;
const R = 8.314462618;
const PRESSURE_PA = 101_325;
const KELVIN = 273.15;

/** Carbon monoxide in a closed room by volume, ppm. */
export const carbonMonoxide = defineMethod({
  id: 'smoke.carbon-monoxide',
  version: 1,
  title: 'Carbon monoxide in a closed room',
  symbol: 'X_CO',
  unit: 'ppm',
  inputs: {
    y: { symbol: 'y_CO', unit: 'kg/kg', quantity: 'Yield', valid: [0, 0.3] },
    m: { symbol: 'm', unit: 'kg', quantity: 'Mass burnt', valid: [0, 1e6] },
    V: { symbol: 'V', unit: 'm3', quantity: 'Volume', valid: [0.1, 1e7] },
    T: { symbol: 'T', unit: '°C', quantity: 'Temperature of the gas', valid: [-40, 1200] },
  },
  equation: 'X_CO = 10⁶ (y_CO m/0.02801) R T/(p V), at most 10⁶',
  sources: [
    definition('ideal gas at 101 325 Pa'),
    recalled('Tewarson, SFPE Handbook of Fire Protection Engineering', 'yields; short of air about 0.2 kg/kg'),
  ],
  assumptions: ['Mixed through the whole room, none leaves it. Short of air yields rise tenfold: show 0.2 kg/kg too.'],
  why: 'It is what most people die of in a fire.',
  outOfRange: 'refuse',
  run: ({ y, m, V, T }) => Math.min(1e6, (((1e6 * y * m) / CO_KG_MOL) * R * (T + KELVIN)) / (PRESSURE_PA * V)),
});
