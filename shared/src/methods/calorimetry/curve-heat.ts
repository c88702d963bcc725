import { defineMethod } from '../define-method.ts';
import { OutOfRangeError } from '../estimate.ts';
import { definition } from '../sources.ts';

/** Heat under a measured heat release rate, straight between the points: MJ from kW, MJ/m² from kW/m². */
export const curveHeat = defineMethod({
  id: 'calorimetry.curve-heat',
  version: 1,
  title: 'Heat under a measured curve',
  symbol: 'Q',
  unit: 'MJ',
  inputs: {
    t: { symbol: 't_i', unit: 's', quantity: 'Time', valid: [0, 1e6], list: true },
    q: { symbol: 'q_i', unit: 'kW', quantity: 'Heat release rate', valid: [0, 1e6], list: true },
  },
  equation: 'Q = Σ (q_i + q_i−1)/2 · (t_i − t_i−1)/1000',
  sources: [definition('area under straight lines between points')],
  assumptions: ['The rate is straight between two readings. Per m² of the test piece the result is MJ/m².'],
  why: 'What a piece released in the test is the area under its curve.',
  outOfRange: 'refuse',
  run({ t, q }) {
    if (t.length !== q.length) throw new OutOfRangeError('Every time needs one rate.');
    let kilojoules = 0;
    for (let i = 1; i < t.length; i += 1) {
      const step = t[i]! - t[i - 1]!;
      if (!(step > 0)) throw new OutOfRangeError('Each time of the curve must be later than the one before it.');
      kilojoules += ((q[i]! + q[i - 1]!) / 2) * step;
    }
    return kilojoules / 1000;
  },
});
