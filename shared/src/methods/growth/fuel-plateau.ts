import { defineMethod } from '../define-method.ts';
import { en1991, recalled } from '../sources.ts';

/** Heat release rate of a fire that its fuel limits, kW: rate per area × fire area, not above the sum of known peaks. */
export const fuelPlateau = defineMethod({
  id: 'growth.fuel-plateau-2002',
  version: 1,
  title: 'What the fuel can feed',
  symbol: 'Q_max,f',
  unit: 'kW',
  inputs: {
    RHR_f: { symbol: 'RHR_f', unit: 'kW/m2', quantity: 'Heat release rate per area', valid: [0, Infinity] },
    A_fi: { symbol: 'A_fi', unit: 'm2', quantity: 'Fire area', valid: [0, Infinity] },
    peaks: {
      symbol: 'Q_p,i',
      unit: 'kW',
      quantity: 'Peaks of the entries, when every one is known',
      valid: [0, 1e9],
      list: true,
    },
  },
  equation: 'Q_max,f = RHR_f · A_fi, at most Σ Q_p,i',
  sources: [
    en1991('E.4(5)-(6), Table E.5'),
    recalled('Hopkin, Spearpoint & Hopkin, heat release rate per area of offices and shops', 'review', '2019'),
  ],
  assumptions: ['The whole fire area burns at once; spread inside it is in the growth phase.'],
  why: 'Entries cannot give more than their own peaks, however large the floor.',
  outOfRange: 'warn',
  run({ RHR_f, A_fi, peaks }) {
    const byArea = RHR_f * A_fi;
    return peaks.length === 0 ? byArea : Math.min(byArea, sum(peaks));
  },
});

/** Heat release rate of entries that all burn at their peaks, kW. */
export const sumOfPeaks = defineMethod({
  id: 'growth.sum-of-peaks',
  version: 1,
  title: 'What the entries can feed',
  symbol: 'Q_max,f',
  unit: 'kW',
  inputs: {
    peaks: { symbol: 'Q_p,i', unit: 'kW', quantity: 'Peak of each entry', valid: [0, 1e9], list: true },
  },
  equation: 'Q_max,f = Σ Q_p,i',
  sources: [
    en1991('E.4(5): the fire area may be smaller for a localised fire'),
    recalled('Common practice', 'sum of peaks'),
  ],
  assumptions: ['All entries burn at their peaks at the same moment; they seldom do.'],
  why: 'A few entries on a large floor cannot make the whole floor burn.',
  outOfRange: 'warn',
  run: ({ peaks }) => sum(peaks),
});

function sum(values: readonly number[]): number {
  return values.reduce((a, b) => a + b, 0);
}
