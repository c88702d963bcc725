import { designFire } from '../methods/growth/design-fire.ts';
import type { SpreadEntry } from './spread-entry.ts';

const KJ_PER_MJ = 1000;

/** A heat release rate made of pieces c0 + c1 τ + c2 τ², kW over s since its ignition; 0 after the end. */
export interface OwnCurve {
  /** Where each piece begins, s; the last one is the end of burning. */
  readonly starts: readonly number[];
  /** One triple per piece. */
  readonly pieces: readonly (readonly [number, number, number])[];
  /** s */
  readonly end: number;
  /** kW */
  readonly peak: number;
}

/**
 * How an entry burns when nothing holds it back.
 * @param entry heat and peak above 0
 * @param least_kW_s2 growth of t-squared entries is at least this, for what flashover lights
 */
export function ownCurve(entry: SpreadEntry, least_kW_s2 = 0): OwnCurve {
  const { heat_MJ, peak_kW, growth } = entry;
  switch (growth.by) {
    case 'step': {
      const end = (heat_MJ * KJ_PER_MJ) / peak_kW;
      return { starts: [0, end], pieces: [[peak_kW, 0, 0]], end, peak: peak_kW };
    }
    case 'measured':
      return measured(growth.points, heat_MJ * KJ_PER_MJ);
    case 't-squared':
      return squared(heat_MJ, peak_kW, Math.max(growth.alpha_kW_s2, least_kW_s2));
  }
}

function squared(E: number, Q_max: number, alpha: number): OwnCurve {
  const { growthEnd, decayStart, end, peak } = designFire.run({ E, Q_max, alpha });
  const slope = peak / (end - decayStart);
  const decay = [slope * end, -slope, 0] as const;
  if (decayStart > growthEnd) {
    return {
      starts: [0, growthEnd, decayStart, end],
      pieces: [[0, 0, alpha], [peak, 0, 0], decay],
      end,
      peak,
    };
  }
  return { starts: [0, growthEnd, end], pieces: [[0, 0, alpha], decay], end, peak };
}

function measured(points: readonly (readonly [number, number])[], energy: number): OwnCurve {
  const stretch = energy / areaUnder(points);
  const starts = points[0]![0] > 0 ? [0] : [];
  const pieces: [number, number, number][] = points[0]![0] > 0 ? [[0, 0, 0]] : [];
  for (let i = 1; i < points.length; i += 1) {
    const [t0, q0] = points[i - 1]!;
    const [t1, q1] = points[i]!;
    if (!(t1 > t0)) continue;
    const slope = (q1 - q0) / ((t1 - t0) * stretch);
    starts.push(t0 * stretch);
    pieces.push([q0 - slope * t0 * stretch, slope, 0]);
  }
  const end = points.at(-1)![0] * stretch;
  return { starts: [...starts, end], pieces, end, peak: Math.max(...points.map(([, q]) => q)) };
}

/** Area under straight lines between `[s, kW]` pairs, kJ. */
export function areaUnder(points: readonly (readonly [number, number])[]): number {
  let area = 0;
  for (let i = 1; i < points.length; i += 1) {
    area += ((points[i]![0] - points[i - 1]![0]) * (points[i]![1] + points[i - 1]![1])) / 2;
  }
  return area;
}

/** Rate at `tau` seconds after ignition, kW; 0 before and after. */
export function rateAt(curve: OwnCurve, tau: number): number {
  if (tau < 0 || tau >= curve.end) return 0;
  let piece = 0;
  while (curve.starts[piece + 1]! <= tau) piece += 1;
  const [c0, c1, c2] = curve.pieces[piece]!;
  return c0 + tau * (c1 + tau * c2);
}

/** Seconds after ignition at which the curve first reaches a rate, kW; Infinity when it never does. */
export function timeToRate(curve: OwnCurve, rate: number): number {
  for (const [index, [c0, c1, c2]] of curve.pieces.entries()) {
    const from = curve.starts[index]!;
    const to = curve.starts[index + 1]!;
    if (c0 + from * (c1 + from * c2) >= rate) return from;
    if (c0 + to * (c1 + to * c2) < rate) continue;
    return c2 > 0 ? Math.sqrt((rate - c0) / c2) : (rate - c0) / c1;
  }
  return Infinity;
}
