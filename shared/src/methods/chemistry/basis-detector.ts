import { checkBasis } from '../../chemistry/basis-check.ts';
import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';
import { ATOM_INPUTS } from './atom-inputs.ts';

/** Whether a claimed net heat fits the formula; names the likely mistake and proposes a factor, applies nothing. */
export const basisDetector = defineMethod({
  id: 'chemistry.basis-detector',
  version: 2,
  title: 'Basis of a claimed heat',
  symbol: 'E',
  unit: 'MJ/kg',
  inputs: {
    ...ATOM_INPUTS,
    net: { symbol: 'ΔH_c,net', unit: 'kJ/mol', quantity: 'Net heat of one mole as claimed', valid: [1e-6, 1e9] },
  },
  equation: 'E = ΔH_c,net/(31.998 ν): 11 to 15 fits; 13.1/E within 12 % of 2, 3, 4, 1/2, 1/3, 1/4: wrong mole basis',
  sources: [
    recalled('Huggett, Estimation of rate of heat release by means of oxygen consumption', '13.1 MJ/kg ± 5 %', '1980'),
    {
      title: 'Peacock & Babrauskas, Fire Safety Journal 17',
      edition: '1991',
      locator: 'page 387: 13.1 and 17.6 MJ/kg',
    },
  ],
  assumptions: [
    'Acetylene, hydrogen, carbon monoxide, formaldehyde, hydrogen cyanide, hydrogen sulfide and sulfur are really outside the band.',
    'A high heat is not judged where the oxygen of nitro and nitrate groups, three atoms per nitrogen, would explain it.',
  ],
  why: 'A value for two moles taken for one doubles a fire load and looks like any other number.',
  outOfRange: 'refuse',
  outputs: { perOxygen: { symbol: 'E', unit: 'MJ/kg', quantity: 'Net heat per kg of oxygen' } },
  run: ({ net, ...atoms }) => checkBasis(atoms, net),
  explain: (_inputs, { text }) => [{ text }],
});
