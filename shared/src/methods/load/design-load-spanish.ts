import { defineMethod } from '../define-method.ts';
import { dbSi } from '../sources.ts';

const yesNo = ['yes', 'no'] as const;

/** Nodes of δ_q1: floor area in m² and factor; straight lines between, as the code states. */
const SIZE = [
  [25, 1.1],
  [250, 1.5],
  [2500, 1.9],
  [5000, 2],
  [10_000, 2.13],
] as const;
const SMALL_M2 = 20;
const RISK = { low: 1, middle: 1.25, 'special-medium': 1.4, 'special-high': 1.6 } as const;
const HEIGHT = { 'under-15-m': 1, 'to-28-m': 1.5, 'above-28-m': 2 } as const;

function sizeFactor(area: number): number {
  if (area < SMALL_M2) return 1;
  const above = SIZE.findIndex(([node]) => area <= node);
  if (above === -1) return SIZE.at(-1)![1];
  const [x1, y1] = SIZE[above]!;
  if (above === 0) return y1;
  const [x0, y0] = SIZE[above - 1]!;
  return y0 + ((y1 - y0) * (area - x0)) / (x1 - x0);
}

/** Design fire load by the Spanish building code: its own factors for use and for the height of escape, MJ/m². */
export const designLoadSpanish = defineMethod({
  id: 'load.design-es-2025',
  version: 1,
  title: 'Design fire load, Spanish scheme',
  symbol: 'q_f,d',
  unit: 'MJ/m2',
  inputs: {
    q_fk: { symbol: 'q_f,k', unit: 'MJ/m2', quantity: 'Characteristic load per floor area', valid: [0, 1e6] },
    m: { symbol: 'm', unit: '', quantity: 'Combustion factor', valid: [0, 1] },
    A: { symbol: 'A', unit: 'm2', quantity: 'Floor area of the compartment', valid: [1, 1e6] },
    risk: { symbol: 'δ_q2', quantity: 'Use', choices: ['low', 'middle', 'special-medium', 'special-high'] },
    suppression: { symbol: 'δ_n1', quantity: 'Automatic water extinguishing', choices: yesNo },
    detection: { symbol: 'δ_n2', quantity: 'Automatic detection', choices: yesNo },
    transmission: { symbol: 'δ_n3', quantity: 'Automatic alarm to the fire brigade', choices: yesNo },
    height: { symbol: 'δ_c', quantity: 'Height of escape', choices: ['under-15-m', 'to-28-m', 'above-28-m'] },
  },
  equation: 'q_f,d = q_f,k m δ_q1 δ_q2 δ_n δ_c',
  sources: [dbSi('B.4, equation (B.7) and its tables: δ_q1 1.10 to 2.13 in straight lines, δ_q2 1 to 1.6, δ_c 1 to 2')],
  assumptions: ['Hospitals take 1.5 times δ_c; here it is left out.', 'Below 20 m² δ_q1 is 1, above 10,000 m² 2.13.'],
  why: 'Where that code applies its own factors count, which differ from the European table.',
  outOfRange: 'refuse',
  outputs: {
    load: { symbol: 'q_f,d', unit: 'MJ/m2', quantity: 'Design fire load' },
    size: { symbol: 'δ_q1', unit: '', quantity: 'Factor for size' },
    use: { symbol: 'δ_q2', unit: '', quantity: 'Factor for use' },
    protection: { symbol: 'δ_n', unit: '', quantity: 'Factor for protection' },
    consequence: { symbol: 'δ_c', unit: '', quantity: 'Factor for the height of escape' },
  },
  run(given) {
    const size = sizeFactor(given.A);
    const use = RISK[given.risk];
    const protection =
      (given.suppression === 'yes' ? 0.61 : 1) *
      (given.detection === 'yes' ? 0.87 : 1) *
      (given.transmission === 'yes' ? 0.87 : 1);
    const consequence = HEIGHT[given.height];
    return { load: given.q_fk * given.m * size * use * protection * consequence, size, use, protection, consequence };
  },
});
