import { fillSamples, type FillSamples } from './fill-samples.ts';
import type { LoadModel, ModelEntry } from './load-model.ts';
import { fillUniform, randomStream } from './random-stream.ts';

/** Samples of one room's load: what is recorded, before anything overlooked and any floor area. Same order in each. */
export interface LoadSamples {
  /** Q, MJ */
  readonly total: Float64Array;
  /** Σ m Q, MJ */
  readonly released: Float64Array;
  /** Σ Q with what makes it the characteristic load, MJ */
  readonly characteristic: Float64Array;
}

/** Samples done between two looks: columns of this length stay in the nearest memory. */
const CHUNK = 512;
/** Numbers in all heat columns together; a room of very many heats is sampled in shorter chunks. */
const MOST_IN_COLUMNS = 2 ** 22;
const NORMAL = fillSamples({ kind: 'normal', mean: 0, deviation: 1 });

/**
 * Monte Carlo of a load, column by column (JCGM 101:2008, propagation of distributions). Gives the share done after each
 * chunk; whoever runs it may stop at any of them. Pure: the same model, number and seed give the same samples.
 * @param samples 1 and more
 */
export function* sampleLoad(model: LoadModel, samples: number, seed: number): Generator<number, LoadSamples> {
  const total = new Float64Array(samples);
  const released = new Float64Array(samples);
  const characteristic = new Float64Array(samples);
  const chunk = Math.max(16, Math.min(CHUNK, Math.floor(MOST_IN_COLUMNS / (model.heats.length + 1))));
  const heats = heatSampler(model, seed, chunk);
  const scratch = {
    mass: new Float64Array(chunk),
    cabinet: new Float64Array(chunk),
    heat: new Float64Array(chunk),
    released: new Float64Array(chunk),
  };
  const entries = model.entries.map((entry) => entrySampler(entry, seed, scratch));
  const shares = commonShares(model);
  for (let from = 0; from < samples; from += chunk) {
    const count = Math.min(chunk, samples - from);
    const columns = heats(count);
    const Q = total.subarray(from, from + count);
    const R = released.subarray(from, from + count);
    const K = characteristic.subarray(from, from + count);
    for (const add of entries) {
      add(columns, count, shares.combustion === null ? R : null, shares.characteristic === null ? K : null, Q);
    }
    if (shares.combustion !== null) scale(Q, R, shares.combustion);
    if (shares.characteristic !== null) scale(Q, K, shares.characteristic);
    yield (from + count) / samples;
  }
  return { total, released, characteristic };
}

/** Where every part has the same factor, its sum needs no samples of its own. */
function commonShares({ entries }: LoadModel) {
  const combustions = new Set(entries.flatMap(({ terms }) => terms.map(({ combustion }) => combustion)));
  const characteristics = new Set(entries.map((entry) => entry.characteristic));
  return { combustion: only(combustions), characteristic: only(characteristics) };
}

function only(values: ReadonlySet<number>): number | null {
  return values.size > 1 ? null : ([...values][0] ?? 1);
}

function scale(from: Float64Array, to: Float64Array, factor: number): void {
  for (let i = 0; i < to.length; i += 1) to[i] = from[i]! * factor;
}

/** One column a heat; heats of one material come from the same uniform numbers. */
function heatSampler({ materials, heats }: LoadModel, seed: number, chunk: number) {
  const columns = heats.map(() => new Float64Array(chunk));
  const uniform = new Float64Array(chunk);
  const moisture = new Float64Array(chunk);
  const groups = materials.map(({ key }) => ({
    state: randomStream(seed, `heat:${key}`),
    moist: randomStream(seed, `moisture:${key}`),
    heats: [] as { fill: FillSamples; column: Float64Array; moisture: number }[],
  }));
  heats.forEach((heat, index) => {
    const sampled = { fill: fillSamples(heat.distribution), column: columns[index]!, moisture: heat.moisture };
    groups[heat.material]!.heats.push(sampled);
  });
  return (count: number): readonly Float64Array[] => {
    for (const group of groups) {
      fillUniform(group.state, uniform, count);
      let drawn = false;
      for (const heat of group.heats) {
        heat.fill(uniform, heat.column, count);
        if (heat.moisture === 0) continue;
        if (!drawn) {
          fillUniform(group.moist, moisture, count);
          NORMAL(moisture, moisture, count);
          drawn = true;
        }
        wet(heat.column, moisture, heat.moisture, count);
      }
    }
    return columns;
  };
}

function wet(column: Float64Array, moisture: Float64Array, slope: number, count: number): void {
  for (let i = 0; i < count; i += 1) column[i] = Math.max(0, column[i]! - slope * moisture[i]!);
}

type AddEntry = (
  heats: readonly Float64Array[],
  count: number,
  released: Float64Array | null,
  characteristic: Float64Array | null,
  total: Float64Array,
) => void;

type Scratch = Readonly<Record<'mass' | 'cabinet' | 'heat' | 'released', Float64Array>>;

/** Adds an entry's heat to the sums: its mass and its cabinet are inputs of its own. */
function entrySampler(entry: ModelEntry, seed: number, scratch: Scratch): AddEntry {
  const { terms, characteristic: share } = entry;
  const mass = columnOf(seed, `mass:${entry.id}`, fillSamples(entry.mass));
  const cabinet = entry.cabinet && columnOf(seed, `cabinet:${entry.id}`, fillSamples(entry.cabinet));
  const { heat, released: free } = scratch;
  // Most entries are of one material and in no cabinet: one pass is enough for them.
  const [first] = terms;
  const only = first !== undefined && terms.length === 1 && !first.inCabinet ? first : null;
  return (heats, count, released, characteristic, total) => {
    mass(scratch.mass, count);
    if (only !== null && released === null && characteristic === null) {
      addProduct(total, scratch.mass, heats[only.heat]!, only.mass, count);
      return;
    }
    cabinet?.(scratch.cabinet, count);
    heat.fill(0, 0, count);
    if (released !== null) free.fill(0, 0, count);
    for (const term of terms) {
      const own = heats[term.heat]!;
      const psi = term.inCabinet ? scratch.cabinet : null;
      addTerm(heat, own, psi, term.mass, count);
      if (released !== null) addTerm(free, own, psi, term.mass * term.combustion, count);
    }
    addProduct(total, scratch.mass, heat, 1, count);
    if (released !== null) addProduct(released, scratch.mass, free, 1, count);
    if (characteristic !== null) addProduct(characteristic, scratch.mass, heat, share, count);
  };
}

/** The next samples of one input, from its own stream. */
function columnOf(seed: number, name: string, fill: FillSamples): (out: Float64Array, count: number) => void {
  const state = randomStream(seed, name);
  return (out, count) => {
    fillUniform(state, out, count);
    fill(out, out, count);
  };
}

function addTerm(sum: Float64Array, heat: Float64Array, psi: Float64Array | null, mass: number, count: number): void {
  if (psi === null) for (let i = 0; i < count; i += 1) sum[i]! += mass * heat[i]!;
  else for (let i = 0; i < count; i += 1) sum[i]! += mass * heat[i]! * psi[i]!;
}

function addProduct(sum: Float64Array, a: Float64Array, b: Float64Array, factor: number, count: number): void {
  for (let i = 0; i < count; i += 1) sum[i]! += factor * a[i]! * b[i]!;
}
