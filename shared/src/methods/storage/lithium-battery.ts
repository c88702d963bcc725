import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Heat, rate and hydrogen fluoride of a lithium-ion battery that burns out, as ranges. */
export const lithiumBattery = defineMethod({
  id: 'storage.lithium-battery',
  version: 1,
  title: 'Lithium-ion battery',
  symbol: 'Q',
  unit: 'MJ',
  inputs: { E: { symbol: 'E', unit: 'kWh', quantity: 'Stored energy when full', valid: [0, 1e5] } },
  equation: 'Q = 15, 30, 75 MJ/kWh;  Q_peak = 110 to 490 kW/kWh;  HF 20 to 200 mg/Wh',
  sources: [
    recalled('Literature on burnt lithium-ion cells by oxygen consumption', '28 to 75 MJ/kWh; design 30'),
    {
      title: 'Larsson et al., Toxic fluoride gas emissions from lithium-ion battery fires',
      edition: '2017',
      locator: 'abstract: 20 to 200 mg/Wh',
    },
  ],
  assumptions: [
    'The total follows energy and mass, hardly the state of charge; the rate follows the charge: at 100 % two to three times that at half.',
    'Gas that is vented can explode and cells light again after hours: that is a flag and no number.',
  ],
  why: 'Packs hold 8 to 20 times their electrical energy as heat.',
  outOfRange: 'refuse',
  outputs: {
    low: { symbol: 'Q_low', unit: 'MJ', quantity: 'Heat, low end' },
    typical: { symbol: 'Q', unit: 'MJ', quantity: 'Heat, usual' },
    high: { symbol: 'Q_high', unit: 'MJ', quantity: 'Heat, high end' },
    peakLow: { symbol: 'Q_p,low', unit: 'kW', quantity: 'Peak, low end' },
    peakHigh: { symbol: 'Q_p,high', unit: 'kW', quantity: 'Peak, high end' },
    fluorideLow: { symbol: 'm_HF,low', unit: 'g', quantity: 'Hydrogen fluoride, low end' },
    fluorideHigh: { symbol: 'm_HF,high', unit: 'g', quantity: 'Hydrogen fluoride, high end' },
  },
  run: ({ E }) => ({
    low: 15 * E,
    typical: 30 * E,
    high: 75 * E,
    peakLow: 110 * E,
    peakHigh: 490 * E,
    fluorideLow: 20 * E,
    fluorideHigh: 200 * E,
  }),
});
