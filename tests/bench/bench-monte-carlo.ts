import type { LoadModel } from '@embertally/shared/uncertainty/load-model';
import { sampleLoad } from '@embertally/shared/uncertainty/sample-load';
import { atMost, median, type BenchRow } from './bench-row.ts';

const SAMPLES = 20_000;
const ENTRIES = 200;
const MATERIALS = 40;
const ROUNDS = 7;
const SIGMA_OF = [0.03, 0.1, 0.2, 0.3, 0.5];
const LEAST_RATE = 0.6;

const spreadOf = (entry: number): number => SIGMA_OF[1 + (entry % 4)]!;
const massOf = (entry: number): number => 20 + ((entry * 37) % 200);

function model(): LoadModel {
  return {
    materials: Array.from({ length: MATERIALS }, (_, i) => ({ key: `m${i}`, label: `Material ${i}` })),
    heats: Array.from({ length: MATERIALS }, (_, material) => ({
      material,
      distribution: { kind: 'triangular', low: 15, mode: 17.5, high: 20 },
      moisture: 0,
    })),
    entries: Array.from({ length: ENTRIES }, (_, entry) => ({
      id: `e${entry}`,
      label: `Entry ${entry}`,
      mass: { kind: 'lognormal', mean: 1, deviation: spreadOf(entry) },
      cabinet: null,
      terms: [{ heat: entry % MATERIALS, mass: massOf(entry), inCabinet: false, combustion: 0.8 }],
      characteristic: 1,
    })),
  };
}

function drawn(): Float64Array {
  const run = sampleLoad(model(), SAMPLES, 1);
  for (;;) {
    const step = run.next();
    if (step.done === true) return step.value.total.sort();
  }
}

/** The same sum as somebody would write it down for this one room: typed arrays, xorshift, Box–Muller, no streams. */
function byHand(): Float64Array {
  let state = 0x9e3779b9;
  const uniform = (): number => {
    state ^= state << 13;
    state ^= state >>> 17;
    state ^= state << 5;
    return ((state >>> 0) + 0.5) / 4294967296;
  };
  const total = new Float64Array(SAMPLES);
  const heats = new Float64Array(MATERIALS);
  const mu = new Float64Array(ENTRIES);
  const sigma = new Float64Array(ENTRIES);
  for (let entry = 0; entry < ENTRIES; entry += 1) {
    const variance = Math.log(1 + spreadOf(entry) ** 2);
    mu[entry] = -variance / 2;
    sigma[entry] = Math.sqrt(variance);
  }
  for (let sample = 0; sample < SAMPLES; sample += 1) {
    for (let k = 0; k < MATERIALS; k += 1) {
      const u = uniform();
      heats[k] = u < 0.5 ? 15 + Math.sqrt(u * 12.5) : 20 - Math.sqrt((1 - u) * 12.5);
    }
    let sum = 0;
    for (let entry = 0; entry < ENTRIES; entry += 2) {
      const radius = Math.sqrt(-2 * Math.log(uniform()));
      const angle = 2 * Math.PI * uniform();
      sum +=
        massOf(entry) * heats[entry % MATERIALS]! * Math.exp(mu[entry]! + sigma[entry]! * radius * Math.cos(angle));
      const next = entry + 1;
      sum += massOf(next) * heats[next % MATERIALS]! * Math.exp(mu[next]! + sigma[next]! * radius * Math.sin(angle));
    }
    total[sample] = sum;
  }
  return total.sort();
}

function milliseconds(run: () => Float64Array): number {
  const began = performance.now();
  run();
  return performance.now() - began;
}

/** Sampling of 200 entries, 20,000 times, against a loop written by hand; turn by turn, because the machine is shared. */
export function benchMonteCarlo(): Promise<readonly BenchRow[]> {
  const [ours, theirs] = [drawn(), byHand()];
  for (const place of [0.05, 0.5, 0.95]) {
    const at = Math.ceil(place * SAMPLES) - 1;
    if (Math.abs(ours[at]! / theirs[at]! - 1) > 0.005) throw new Error('The two do not sample the same room.');
  }
  const rounds = Array.from({ length: ROUNDS }, () => ({ ours: milliseconds(drawn), theirs: milliseconds(byHand) }));
  const rate = median(rounds.map((round) => round.theirs / round.ours));
  return Promise.resolve([
    atMost('Monte Carlo, 20,000 samples of 200 entries', median(rounds.map((round) => round.ours)), 'ms', 600),
    atMost('the same as a loop written by hand', median(rounds.map((round) => round.theirs)), 'ms', null),
    atMost(`loop by hand over ours, at most 1/${LEAST_RATE}`, 1 / rate, '', 1 / LEAST_RATE),
  ]);
}
