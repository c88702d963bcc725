import { defineMethod } from '../define-method.ts';
import { italianDecree } from '../sources.ts';

const yesNo = ['yes', 'no'] as const;

/** Below each area, m², the factor; above the last one 2.00. */
const SIZE = [
  [500, 1],
  [1000, 1.2],
  [2500, 1.4],
  [5000, 1.6],
  [10_000, 1.8],
] as const;
const RISK = { I: 0.8, II: 1, III: 1.2 } as const;
/** Up to each specific load, MJ/m², the class in minutes for performance level III. */
const CLASSES = [
  [100, 0],
  [200, 15],
  [300, 20],
  [450, 30],
  [600, 45],
  [900, 60],
  [1200, 90],
  [1800, 120],
  [2400, 180],
] as const;

/** Specific design fire load and class of the Italian decree: a scheme of its own, never mixed with the European factors. */
export const designLoadItalian = defineMethod({
  id: 'load.design-it-2007',
  version: 1,
  title: 'Specific design fire load, Italian scheme',
  symbol: 'q_f,d',
  unit: 'MJ/m2',
  inputs: {
    q_f: { symbol: 'q_f', unit: 'MJ/m2', quantity: 'Specific fire load', valid: [0, 1e6] },
    A: { symbol: 'A', unit: 'm2', quantity: 'Floor area of the compartment', valid: [1, 1e6] },
    risk: { symbol: '', quantity: 'Risk class', choices: ['I', 'II', 'III'] },
    suppression: { symbol: 'δ_n1', quantity: 'Automatic suppression', choices: ['none', 'other', 'water'] },
    smoke: { symbol: 'δ_n3', quantity: 'Automatic smoke and heat control', choices: yesNo },
    detection: { symbol: 'δ_n4', quantity: 'Automatic detection and alarm', choices: yesNo },
    team: { symbol: 'δ_n5', quantity: 'Fire team always on duty', choices: yesNo },
    hydrants: { symbol: 'δ_n6, δ_n7', quantity: 'Hydrants', choices: ['none', 'internal', 'internal-and-external'] },
    routes: { symbol: 'δ_n8', quantity: 'Protected routes of access', choices: yesNo },
    access: { symbol: 'δ_n9', quantity: 'Access for fire vehicles', choices: yesNo },
  },
  equation: 'q_f,d = δ_q1 δ_q2 δ_n q_f',
  sources: [italianDecree('annex, points 2 and 3: tables of δ_q1, δ_q2, δ_n and classes')],
  assumptions: ['δ_q1 in steps. Classes are those of performance level III.'],
  why: 'Where the decree applies its own factors count, which differ from the European table.',
  outOfRange: 'refuse',
  outputs: {
    load: { symbol: 'q_f,d', unit: 'MJ/m2', quantity: 'Specific design fire load' },
    size: { symbol: 'δ_q1', unit: '', quantity: 'Factor for size' },
    riskFactor: { symbol: 'δ_q2', unit: '', quantity: 'Factor for risk' },
    protection: { symbol: 'δ_n', unit: '', quantity: 'Factor for protection' },
    minutes: { symbol: 'REI', unit: 'min', quantity: 'Class, level III' },
  },
  run(given) {
    const size = SIZE.find(([below]) => given.A < below)?.[1] ?? 2;
    const riskFactor = RISK[given.risk];
    const protection =
      { none: 1, other: 0.8, water: 0.6 }[given.suppression] *
      (given.smoke === 'yes' ? 0.9 : 1) *
      (given.detection === 'yes' ? 0.85 : 1) *
      (given.team === 'yes' ? 0.9 : 1) *
      { none: 1, internal: 0.9, 'internal-and-external': 0.8 }[given.hydrants] *
      (given.routes === 'yes' ? 0.9 : 1) *
      (given.access === 'yes' ? 0.9 : 1);
    const load = size * riskFactor * protection * given.q_f;
    const minutes = CLASSES.find(([up]) => load <= up)?.[1] ?? 240;
    return { load, size, riskFactor, protection, minutes };
  },
});
