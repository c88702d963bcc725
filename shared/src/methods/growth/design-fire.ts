import { defineMethod } from '../define-method.ts';
import { figure } from '../figure.ts';
import { en1991 } from '../sources.ts';

const DECAY_FROM = 0.7;
const GROWTH_POINTS = 40;
const KJ_PER_MJ = 1000;

export interface DesignFire {
  /** s */
  readonly growthEnd: number;
  readonly decayStart: number;
  readonly end: number;
  /** kW */
  readonly peak: number;
  readonly plateauReached: boolean;
}

/** Design fire: t-squared growth, plateau, linear decay from 70 % of the heat, in closed form. */
export const designFire = defineMethod({
  id: 'growth.design-fire-2002',
  version: 1,
  title: 'Design fire',
  symbol: 'Q(t)',
  unit: 'kW',
  inputs: {
    E: { symbol: 'E', unit: 'MJ', quantity: 'Heat released', valid: [1e-9, Infinity] },
    Q_max: {
      symbol: 'Q_max',
      unit: 'kW',
      quantity: 'Highest heat release rate the room allows',
      valid: [1e-9, Infinity],
    },
    alpha: { symbol: 'α', unit: 'kW/s2', quantity: 'Growth coefficient', valid: [1e-9, Infinity] },
  },
  equation:
    'Q = α t² up to t_1 = √(Q_max/α); Q_max until 0.7 E is released; then linear to 0. If 0.7 E < Q_max t_1/3: t_1 = (3 · 0.7 E/α)^⅓ and no plateau',
  sources: [en1991('E.4(2)-(9)')],
  assumptions: [
    'The area under the curve is E in both cases.',
    'Decay from 70 % is right for solid goods; liquids and gases stop when they are used up.',
  ],
  why: 'It is the published design fire that the plateaus of the same annex belong to.',
  outOfRange: 'refuse',
  outputs: {
    growthEnd: { symbol: 't_1', unit: 's', quantity: 'End of growth' },
    decayStart: { symbol: 't_2', unit: 's', quantity: 'Start of decay' },
    end: { symbol: 't_3', unit: 's', quantity: 'End of the fire' },
    peak: { symbol: 'Q_pk', unit: 'kW', quantity: 'Peak' },
  },
  run({ E, Q_max, alpha }): DesignFire {
    const energy = E * KJ_PER_MJ;
    const t1 = Math.sqrt(Q_max / alpha);
    const grown = (Q_max * t1) / 3;
    const beforeDecay = DECAY_FROM * energy;
    if (beforeDecay >= grown) {
      const decayStart = t1 + (beforeDecay - grown) / Q_max;
      const end = decayStart + (2 * (1 - DECAY_FROM) * energy) / Q_max;
      return { growthEnd: t1, decayStart, end, peak: Q_max, plateauReached: true };
    }
    const t = Math.cbrt((3 * beforeDecay) / alpha);
    const peak = alpha * t * t;
    return {
      growthEnd: t,
      decayStart: t,
      end: t + (2 * (1 - DECAY_FROM) * energy) / peak,
      peak,
      plateauReached: false,
    };
  },
  explain({ E, Q_max, alpha }, fire) {
    const t1 = Math.sqrt(Q_max / alpha);
    return [
      { text: 'Time at which α t² would reach Q_max', value: t1, unit: 's' },
      { text: 'Heat released until then, Q_max t_1/3', value: (Q_max * t1) / 3 / KJ_PER_MJ, unit: 'MJ' },
      {
        text: fire.plateauReached
          ? `0.7 E = ${figure(DECAY_FROM * E)} MJ is more: the plateau is reached.`
          : `0.7 E = ${figure(DECAY_FROM * E)} MJ is less: the plateau is never reached.`,
      },
      { text: 'End of growth', value: fire.growthEnd, unit: 's' },
      { text: 'Start of decay', value: fire.decayStart, unit: 's' },
      { text: 'End', value: fire.end, unit: 's' },
      { text: 'Peak', value: fire.peak, unit: 'kW' },
    ];
  },
});

/**
 * The curve as `[s, kW]` pairs joined by straight lines. Growth is drawn in 40 pieces, which makes the area under the
 * curve at most 0.03 % larger than the heat released.
 */
export function designFireCurve(fire: DesignFire): (readonly [number, number])[] {
  const growth = Array.from({ length: GROWTH_POINTS + 1 }, (_, i) => {
    const share = i / GROWTH_POINTS;
    return [fire.growthEnd * share, fire.peak * share * share] as const;
  });
  const plateau = fire.plateauReached ? [[fire.decayStart, fire.peak] as const] : [];
  return [...growth, ...plateau, [fire.end, 0] as const];
}
