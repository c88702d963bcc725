import { defineMethod } from '../define-method.ts';
import { recalled } from '../sources.ts';

/** Heat release rate per floor area of goods stored to another height than in the test, MW/m². */
export const storageHeight = defineMethod({
  id: 'storage.by-height',
  version: 1,
  title: 'Stored goods by height',
  symbol: 'Q″',
  unit: 'MW/m2',
  inputs: {
    Q_ref: { symbol: 'Q″_ref', unit: 'MW/m2', quantity: 'Rate per floor area in the test', valid: [0, 50] },
    h: { symbol: 'h', unit: 'm', quantity: 'Height of the goods', valid: [0.1, 30] },
    h_ref: { symbol: 'h_ref', unit: 'm', quantity: 'Height in the test', valid: [0.5, 15] },
    ratio: { symbol: 'h/h_ref', unit: '', quantity: 'Height against the test', valid: [0.5, 1.2] },
  },
  equation: 'Q″ = Q″_ref h/h_ref',
  sources: [
    recalled('NFPA 92B and 204, tables of stored goods', 'rate per floor area at a stated height'),
    recalled('Common practice', 'in proportion to the height between 0.5 and 1.2 of the tested height'),
  ],
  assumptions: ['Same goods, same packing. Height of the goods without the racks above them.'],
  why: 'Tables give one height; shelves have their own.',
  outOfRange: 'warn',
  run: ({ Q_ref, h, h_ref }) => (Q_ref * h) / h_ref,
});
