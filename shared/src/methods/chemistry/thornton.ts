import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

const PER_OXYGEN = 13.1;
const SPREAD = 0.05;

/** Net heat from the oxygen demand alone, MJ/kg, with its usual spread. */
export const thornton = defineMethod({
  id: 'chemistry.thornton',
  version: 1,
  title: 'Net heat from the oxygen demand, Thornton',
  symbol: 'H_net',
  unit: 'MJ/kg',
  inputs: { r: { symbol: 'r_O2', unit: 'kg/kg', quantity: 'Oxygen demand', valid: [0, 8] } },
  equation: 'H_net = 13.1 r_O2 (± 5 %)',
  sources: [
    { title: 'Yang, Journal of Research of NIST 124', edition: '2019', locator: 'article 016: 13.1 MJ/kg of oxygen' },
    { title: 'Peacock & Babrauskas, Fire Safety Journal 17', edition: '1991', locator: 'page 387: 13 100 kJ/kg' },
    recalled('Huggett, Fire and Materials 4', '13.1 MJ/kg ± 5 % for organic fuels', '1980'),
  ],
  assumptions: ['Not for carbon monoxide, acetylene, hydrogen, sulfur and fuels with oxygen of their own.'],
  why: 'It needs no enthalpy of formation.',
  outOfRange: 'refuse',
  outputs: {
    net: { symbol: 'H_net', unit: 'MJ/kg', quantity: 'Net heat' },
    low: { symbol: 'H_low', unit: 'MJ/kg', quantity: 'Net heat, low end' },
    high: { symbol: 'H_high', unit: 'MJ/kg', quantity: 'Net heat, high end' },
  },
  run({ r }) {
    const net = PER_OXYGEN * r;
    return { net, low: net * (1 - SPREAD), high: net * (1 + SPREAD) };
  },
});
