import { defineMethod } from '../define-method.ts';
import { dbSi, en1991 } from '../sources.ts';

/** The values Table E.1 prints; any other is used with a warning by the caller. */
export const DANGER_OF_ACTIVATION = [0.78, 1, 1.22, 1.44, 1.66] as const;

/** Factor for the danger of activation, as chosen by a person or usual for the use. */
export const deltaQ2 = defineMethod({
  id: 'load.delta-q2-2002',
  version: 1,
  title: 'Factor for danger of activation',
  symbol: 'δ_q2',
  unit: '',
  inputs: {
    chosen: { symbol: 'δ_q2', unit: '', quantity: 'Danger of activation', valid: [0.78, 1.66] },
  },
  equation:
    '0.78 museum, swimming pool; 1.00 office, residence, hotel; 1.22 machinery works; 1.44 chemical laboratory, painting; 1.66 fireworks, paints',
  sources: [en1991('Table E.1'), dbSi('Table B.3 (1.00)')],
  assumptions: ['Nationally determined: some countries print other values.'],
  why: 'The table is the only published scale that goes with the design load of equation (E.1).',
  outOfRange: 'warn',
  run: ({ chosen }) => chosen,
});
