import { defineMethod } from '../define-method.ts';

/** Mass of wood per floor area that would give the same heat, kg/m². */
export const woodEquivalent = defineMethod({
  id: 'load.wood-equivalent',
  version: 1,
  title: 'Wood equivalent of the load',
  symbol: 'm_w',
  unit: 'kg/m2',
  inputs: {
    q: { symbol: 'q', unit: 'MJ/m2', quantity: 'Load per floor area', valid: [0, 1e6] },
    H_w: { symbol: 'H_w', unit: 'MJ/kg', quantity: 'Net heat of the wood it is compared with', valid: [16, 18.5] },
  },
  equation: 'm_w = q/H_w',
  sources: [
    {
      title: 'Chilean fire-load studies under NCh 1916 and OGUC 4.3.4',
      edition: '1993',
      locator: 'wood equivalent at 16.7 MJ/kg',
    },
  ],
  assumptions: ['16.7 to 18 MJ/kg by the code that asks. It says nothing about how fast the goods burn.'],
  why: 'Some codes and older reports count loads in kilograms of wood.',
  outOfRange: 'refuse',
  run: ({ q, H_w }) => q / H_w,
});
