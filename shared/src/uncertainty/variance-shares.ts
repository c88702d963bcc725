import { momentsOf, quantileOf, type Distribution } from './distribution.ts';
import type { LoadModel, ModelEntry } from './load-model.ts';

/** What the density depends on besides its load: the density is (1 + overlooked) Q / (A · floor). */
export interface RoomInputs {
  readonly overlooked: Distribution;
  /** Relative, mean 1. */
  readonly floor: Distribution;
}

export interface VarianceShares {
  /** Relative variance of the density: variance over the square of its mean. */
  readonly variance: number;
  /** Mean of Q (1 + overlooked), MJ. */
  readonly mean: number;
  /** Part of `variance` that each input causes alone; together they are a little less, the rest is inputs together. */
  readonly parts: readonly VariancePart[];
}

export interface VariancePart {
  readonly of: 'mass' | 'enclosure' | 'heat' | 'overlooked' | 'floor';
  /** Place in the model's entries or materials; 0 for the room's own. */
  readonly index: number;
  readonly variance: number;
}

/** A power would differ in its last digit between engines. */
const square = (x: number): number => x * x;
/** Points for heats of one material that are not the same everywhere. */
const POINTS = 400;

/**
 * First-order sensitivity indices of the density, exact: Var(E[Y | X_j]) of I. M. Sobol' (1993; Saltelli and others,
 * Global Sensitivity Analysis: The Primer, 2008, 1.2.14). A load is a sum of products of independent inputs, so the inner
 * mean is linear in each and no sampling is needed. Moisture goes with its material. Left out: that heat ends at 0 however
 * wet it is, and third-order terms of the floor's 1 %.
 */
export function varianceShares(model: LoadModel, room: RoomInputs): VarianceShares {
  const heats = model.heats.map(({ distribution }) => momentsOf(distribution));
  const weights = new Float64Array(model.heats.length);
  let mean = 0;
  let together = 0;
  const parts: { of: VariancePart['of']; index: number; variance: number }[] = [];
  model.entries.forEach((entry, index) => {
    const f = momentsOf(entry.mass);
    const psi = entry.cabinet === null ? { mean: 1, deviation: 0 } : momentsOf(entry.cabinet);
    let inside = 0;
    let all = 0;
    for (const term of entry.terms) {
      const expected = term.mass * heats[term.heat]!.mean;
      if (term.inCabinet) inside += expected;
      const kept = term.inCabinet ? psi.mean : 1;
      all += expected * kept;
      weights[term.heat]! += f.mean * term.mass * kept;
    }
    mean += f.mean * all;
    const byMass = square(f.deviation * all);
    const byCabinet = square(psi.deviation * f.mean * inside);
    parts.push({ of: 'mass', index, variance: byMass });
    if (entry.cabinet !== null) parts.push({ of: 'enclosure', index, variance: byCabinet });
    together += togetherOf(model, entry, f, psi, inside);
  });
  const terms = heatsByMaterial(model);
  model.materials.forEach((_, index) => {
    parts.push({ of: 'heat', index, variance: varianceOfHeats(model, terms[index]!, weights) });
  });
  const load = parts.reduce((sum, { variance }) => sum + variance, 0) + together;
  const o = momentsOf(room.overlooked);
  const g = 1 + o.mean;
  const r = momentsOf(room.floor).deviation;
  if (!(mean > 0)) return { variance: 0, mean: 0, parts: [] };
  const whole = square(mean);
  const relative = parts.map((part) => ({ ...part, variance: part.variance / whole }));
  relative.push({ of: 'overlooked', index: 0, variance: square(o.deviation / g) });
  relative.push({ of: 'floor', index: 0, variance: r * r });
  const variance = (1 + load / whole) * (1 + square(o.deviation / g)) * (1 + r * r) - 1;
  return { variance, mean: mean * g, parts: relative };
}

/** Variance from two or three inputs of an entry moving at once. */
function togetherOf(
  model: LoadModel,
  entry: ModelEntry,
  f: { mean: number; deviation: number },
  psi: { mean: number; deviation: number },
  inside: number,
): number {
  const all = new Map<number, number>();
  const inCabinet = new Map<number, number>();
  for (const { heat, mass, inCabinet: sampled } of entry.terms) {
    const { material, distribution, moisture } = model.heats[heat]!;
    const spread = mass * Math.sqrt(square(momentsOf(distribution).deviation) + square(moisture));
    all.set(material, (all.get(material) ?? 0) + spread * (sampled ? psi.mean : 1));
    if (sampled) inCabinet.set(material, (inCabinet.get(material) ?? 0) + spread);
  }
  const squares = (sums: ReadonlyMap<number, number>) => [...sums.values()].reduce((sum, one) => sum + one * one, 0);
  const [v, w] = [square(f.deviation), square(psi.deviation)];
  return v * squares(all) + (v + square(f.mean)) * w * squares(inCabinet) + v * w * inside * inside;
}

function heatsByMaterial({ materials, heats }: LoadModel): readonly number[][] {
  const lists: number[][] = materials.map(() => []);
  heats.forEach(({ material }, index) => lists[material]!.push(index));
  return lists;
}

/** Variance of the weighted sum of one material's heats, which all follow the same uniform number. */
function varianceOfHeats(model: LoadModel, indices: readonly number[], weights: Float64Array): number {
  const wet = square(indices.reduce((sum, index) => sum + weights[index]! * model.heats[index]!.moisture, 0));
  const [first] = indices;
  if (first === undefined) return 0;
  if (indices.length === 1)
    return square(weights[first]! * momentsOf(model.heats[first]!.distribution).deviation) + wet;
  let sum = 0;
  let squares = 0;
  for (let point = 0; point < POINTS; point += 1) {
    const p = (point + 0.5) / POINTS;
    const value = indices.reduce(
      (total, index) => total + weights[index]! * quantileOf(model.heats[index]!.distribution, p),
      0,
    );
    sum += value;
    squares += value * value;
  }
  return Math.max(0, squares / POINTS - square(sum / POINTS)) + wet;
}
