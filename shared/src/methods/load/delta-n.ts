import { defineMethod } from '../define-method.ts';
import { dbSi, en1991 } from '../sources.ts';

const yesNo = ['yes', 'no', 'unknown', 'not-applicable'] as const;

/** The factors of Table E.2 one by one, with the conditions under which each may be used. */
function factors(given: {
  readonly sprinklers: 'yes' | 'no' | 'unknown';
  readonly supplies: number;
  readonly detection: 'none' | 'heat' | 'smoke' | 'both' | 'unknown';
  readonly transmission: 'yes' | 'no' | 'unknown';
  readonly brigade: 'none' | 'works' | 'off-site' | 'both' | 'unknown';
  readonly access: 'pressurised' | 'normal' | 'missing' | 'unknown';
  readonly devices: (typeof yesNo)[number];
  readonly smoke: (typeof yesNo)[number];
}): readonly (readonly [string, number])[] {
  const sprinklers = given.sprinklers === 'yes';
  const detected = given.detection !== 'none' && given.detection !== 'unknown';
  const brigade = given.brigade !== 'none' && given.brigade !== 'unknown';
  const transmitted = given.transmission === 'yes' && (detected || sprinklers) && brigade;
  return [
    ['δ_n1 automatic water extinguishing', sprinklers ? 0.61 : 1],
    [
      'δ_n2 independent water supplies, only with extinguishing',
      sprinklers ? ([1, 0.87, 0.7][given.supplies] ?? 1) : 1,
    ],
    [
      'δ_n3, δ_n4 automatic detection, the better of heat and smoke',
      detected ? (given.detection === 'heat' ? 0.87 : 0.73) : 1,
    ],
    ['δ_n5 automatic transmission, only with detection or extinguishing and a brigade', transmitted ? 0.87 : 1],
    ['δ_n6, δ_n7 brigade, works before off-site', brigade ? (given.brigade === 'off-site' ? 0.78 : 0.61) : 1],
    ['δ_n8 access routes', given.access === 'pressurised' ? 0.9 : given.access === 'missing' ? 1.5 : 1],
    ['δ_n9 fire-fighting devices', given.devices === 'no' ? 1.5 : 1],
    ['δ_n10 smoke exhaust of stairs', given.smoke === 'no' ? 1.5 : 1],
  ];
}

/** Product of the factors for protection. Unknown: no credit for 1 to 7, taken as present for 8 to 10 (callers warn). */
export const deltaN = defineMethod({
  id: 'load.delta-n-2002',
  version: 1,
  title: 'Factors for protection',
  symbol: 'Π δ_n',
  unit: '',
  inputs: {
    sprinklers: { symbol: 'δ_n1', quantity: 'Automatic water extinguishing', choices: ['yes', 'no', 'unknown'] },
    supplies: { symbol: 'δ_n2', unit: '', quantity: 'Independent water supplies', valid: [0, 2] },
    detection: {
      symbol: 'δ_n3, δ_n4',
      quantity: 'Automatic detection',
      choices: ['none', 'heat', 'smoke', 'both', 'unknown'],
    },
    transmission: { symbol: 'δ_n5', quantity: 'Transmission to a brigade', choices: ['yes', 'no', 'unknown'] },
    brigade: { symbol: 'δ_n6, δ_n7', quantity: 'Brigade', choices: ['none', 'works', 'off-site', 'both', 'unknown'] },
    access: { symbol: 'δ_n8', quantity: 'Access routes', choices: ['pressurised', 'normal', 'missing', 'unknown'] },
    devices: { symbol: 'δ_n9', quantity: 'Fire-fighting devices', choices: yesNo },
    smoke: { symbol: 'δ_n10', quantity: 'Smoke exhaust of stairs', choices: yesNo },
  },
  equation: 'Π δ_n = δ_n1 · δ_n2 · … · δ_n10',
  sources: [en1991('Table E.2 and E.1(4)-(5)'), dbSi('Table B.4: 0.61, 0.87, 0.87')],
  assumptions: [
    'A measure counts only where it is in service, to its standard and fit for what is stored.',
    '0.9 is for stairs put under pressure on alarm; an enclosed stair is 1.',
  ],
  why: 'Rows that are alternatives or depend on one another may not be multiplied freely.',
  outOfRange: 'refuse',
  run: (given) => factors(given).reduce((product, [, factor]) => product * factor, 1),
  explain: (given) => factors(given).map(([text, value]) => ({ text, value, unit: '' })),
});
