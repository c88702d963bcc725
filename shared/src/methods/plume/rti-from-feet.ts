import { defineMethod } from '../define-method.ts';
import { definition } from '../sources.ts';

/** Response time index in (m s)^½ from a data sheet in (ft s)^½. */
export const rtiFromFeet = defineMethod({
  id: 'plume.rti-from-feet',
  version: 1,
  title: 'Response time index from feet',
  symbol: 'RTI',
  unit: '(m s)1/2',
  inputs: { RTI_ft: { symbol: 'RTI_ft', unit: '(ft s)1/2', quantity: 'Response time index', valid: [1, 2000] } },
  equation: 'RTI = √0.3048 RTI_ft',
  sources: [definition('1 ft = 0.3048 m')],
  assumptions: [],
  why: 'Data sheets print both; 0.552 lies between them.',
  outOfRange: 'refuse',
  run: ({ RTI_ft }) => Math.sqrt(0.3048) * RTI_ft,
});
