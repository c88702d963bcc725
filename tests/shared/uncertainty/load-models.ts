import type { Distribution } from '@embertally/shared/uncertainty/distribution';
import type { LoadModel, ModelEntry } from '@embertally/shared/uncertainty/load-model';
import { sampleLoad, type LoadSamples } from '@embertally/shared/uncertainty/sample-load';

/** Runs a sampling to its end. */
export function sampled(model: LoadModel, samples: number, seed = 1): LoadSamples {
  const run = sampleLoad(model, samples, seed);
  for (;;) {
    const step = run.next();
    if (step.done === true) return step.value;
  }
}

export interface Item {
  readonly mass: Distribution;
  readonly heat: Distribution;
  /** Items of one material share their heat. */
  readonly material?: string;
}

/** A load of items of one part each, 1 kg times their mass. */
export function loadOf(items: readonly Item[]): LoadModel {
  const keys = [...new Set(items.map(({ material }, i) => material ?? `m${i}`))];
  const entries = items.map(({ mass }, i): ModelEntry => {
    const terms = [{ heat: i, mass: 1, inCabinet: false, combustion: 1 }];
    return { id: `e${i}`, label: `Entry ${i}`, mass, cabinet: null, terms, characteristic: 1 };
  });
  return {
    materials: keys.map((key) => ({ key, label: key })),
    heats: items.map(({ heat, material }, i) => ({
      material: keys.indexOf(material ?? `m${i}`),
      distribution: heat,
      moisture: 0,
    })),
    entries,
  };
}

export const point = (value: number): Distribution => ({ kind: 'triangular', low: value, mode: value, high: value });

export function momentsOfSamples(values: Float64Array): { mean: number; deviation: number } {
  const mean = values.reduce((sum, x) => sum + x, 0) / values.length;
  const variance = values.reduce((sum, x) => sum + (x - mean) ** 2, 0) / values.length;
  return { mean, deviation: Math.sqrt(variance) };
}

export function fractile(values: Float64Array, p: number): number {
  return [...values].sort((a, b) => a - b)[Math.ceil(p * values.length) - 1]!;
}
