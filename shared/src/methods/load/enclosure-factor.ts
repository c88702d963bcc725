import { defineMethod } from '../define-method.ts';
import { en1991, italianDecree } from '../sources.ts';

/** Share of the heat of an entry that a container lets into the fire. */
export const enclosureFactor = defineMethod({
  id: 'load.enclosure-factor',
  version: 1,
  title: 'Enclosure factor',
  symbol: 'ψ_i',
  unit: '',
  inputs: {
    enclosure: { symbol: '', quantity: 'How it is enclosed', choices: ['open', 'cabinet', 'sealed'] },
    rated: { symbol: '', quantity: 'The container has a stated fire rating', choices: ['yes', 'no'] },
    hazardous: {
      symbol: '',
      quantity: 'Liquid, gas, aerosol, battery or oxidiser',
      choices: ['yes', 'no'],
    },
  },
  equation: 'open: 1; closed non-combustible cabinet: 0.85; sealed with a rating: 0, without: 1',
  sources: [italianDecree('annex, point 2: ψ 0 / 0.85 / 1'), en1991('E.2.3: protected fire loads')],
  assumptions: [
    'The rating lasts as long as the fire.',
    'Liquids, gases, aerosols, batteries and oxidisers count in full in any container without a rating.',
  ],
  why: 'ψ = 0 for every closed cabinet would hide most of an archive; the EN rule needs a heat balance nobody makes.',
  outOfRange: 'refuse',
  run({ enclosure, rated, hazardous }) {
    if (enclosure === 'open') return 1;
    if (enclosure === 'sealed') return rated === 'yes' ? 0 : 1;
    return hazardous === 'yes' ? 1 : 0.85;
  },
});
