import { defineMethod } from '../define-method.ts';
import { dbSi, en1991, italianDecree } from '../sources.ts';

const time = { t: { symbol: 't', unit: 'min', quantity: 'Time', valid: [0, 600] } } as const;
const ASSUMED = ['A curve for furnaces: it knows neither the load nor the room and never cools.'];

/** Standard temperature-time curve, °C. */
export const standardCurve = defineMethod({
  id: 'burnout.standard-curve',
  version: 1,
  title: 'Standard temperature-time curve',
  symbol: 'Θ_g',
  unit: '°C',
  inputs: time,
  equation: 'Θ_g = 20 + 345 log10(8 t + 1)',
  sources: [
    en1991('3.2.1, equation (3.4)', false),
    dbSi('B.1'),
    { title: 'ISO 834-1', locator: 'standard curve', fromMemory: true },
  ],
  assumptions: ASSUMED,
  why: 'Rated resistances are found under it.',
  outOfRange: 'warn',
  run: ({ t }) => 20 + 345 * Math.log10(8 * t + 1),
});

/** External fire curve, °C. */
export const externalCurve = defineMethod({
  id: 'burnout.external-curve',
  version: 1,
  title: 'External fire curve',
  symbol: 'Θ_g',
  unit: '°C',
  inputs: time,
  equation: 'Θ_g = 660 (1 − 0.687 e^(−0.32 t) − 0.313 e^(−3.8 t)) + 20',
  sources: [en1991('3.2.2, equation (3.5)', false), italianDecree('annex: nominal curves')],
  assumptions: ASSUMED,
  why: 'For members outside a façade.',
  outOfRange: 'warn',
  run: ({ t }) => 660 * (1 - 0.687 * Math.exp(-0.32 * t) - 0.313 * Math.exp(-3.8 * t)) + 20,
});

/** Hydrocarbon curve, °C. */
export const hydrocarbonCurve = defineMethod({
  id: 'burnout.hydrocarbon-curve',
  version: 1,
  title: 'Hydrocarbon curve',
  symbol: 'Θ_g',
  unit: '°C',
  inputs: time,
  equation: 'Θ_g = 1080 (1 − 0.325 e^(−0.167 t) − 0.675 e^(−2.5 t)) + 20',
  sources: [en1991('3.2.3, equation (3.6)', false), italianDecree('annex: nominal curves')],
  assumptions: ASSUMED,
  why: 'For liquids and plastics, which heat a room faster than the standard curve.',
  outOfRange: 'warn',
  run: ({ t }) => 1080 * (1 - 0.325 * Math.exp(-0.167 * t) - 0.675 * Math.exp(-2.5 * t)) + 20,
});
