import { characteristicLoad } from '../methods/load/characteristic-load.ts';
import { modelEstimate } from '../spread/model-estimate.ts';
import { MONTE_CARLO_METHOD, type SampledQuantity } from '../methods/models/monte-carlo-method.ts';
import type { RoomUncertainty, UncertaintyBand } from '../uncertainty/room-uncertainty.ts';
import type { LoadModel } from '../uncertainty/load-model.ts';
import { sampleLoad, type LoadSamples } from '../uncertainty/sample-load.ts';
import { sampleRoom } from '../uncertainty/sample-room.ts';
import { loadBasis } from './load-basis.ts';
import { loadModelOf } from './load-model-of.ts';
import type { RoomBasis } from './room-basis.ts';
import { roomModelOf } from './room-model-of.ts';
import type { RoomTally } from './room-tally.ts';
import { noteMissing, type TallyContext } from './tally-context.ts';
import { uncertaintyAdvice } from './uncertainty-advice.ts';
import { varianceShareRows } from './variance-share-rows.ts';

export interface Sampling {
  /** 1 and more. */
  readonly samples: number;
  readonly seed: number;
  /** Called with the share done, 0 to 1. */
  readonly onProgress?: ((fraction: number) => void) | undefined;
}

const OF = {
  perFloor: 'load.perFloor',
  peak: 'growth.peak',
  equivalentTime: 'burnout.asKept.equivalentTime',
} as const;

/** The section `uncertainty` of a tally: bands from samples, what they come from and what would make them narrower. */
export function uncertaintySection(
  basis: RoomBasis,
  burnout: RoomTally['burnout'],
  sampling: Sampling,
  context: TallyContext,
): RoomUncertainty {
  const { input, areas, heats, load } = basis;
  const variable = characteristicLoad.run({ fixed: 0, variable: 1, ...loadBasis(input) });
  const model = loadModelOf(input, heats, variable);
  const drawn = sampleRoom(sampled(model, sampling), roomModelOf(basis, burnout), sampling.seed);
  const bandOf = (quantity: SampledQuantity) => {
    const values = drawn[quantity];
    return values && bandOfSamples(quantity, values.sort(), sampling, model, context.workings);
  };
  const [total, perFloor, peak, equivalentTime] = (['total', 'perFloor', 'peak', 'equivalentTime'] as const).map(
    bandOf,
  );
  if (total === undefined) throw new TypeError('The load was not sampled.');
  const bands = {
    total,
    ...(perFloor && { perFloor }),
    ...(peak && { peak }),
    ...(equivalentTime && { equivalentTime }),
  };
  for (const name of ['perFloor', 'peak', 'equivalentTime'] as const) {
    if (bands[name] === undefined)
      noteMissing(context, `uncertainty.bands.${name}`, OF[name], `It needs ${OF[name]}, which could not be computed.`);
  }
  const q = load.perFloor?.value ?? null;
  const floorLoad = { Q: load.total.value ?? 0, A_f: areas.floor, q: q ?? 0 };
  return {
    samples: sampling.samples,
    seed: sampling.seed,
    bands,
    shares: varianceShareRows(model, context.workings),
    advice: q === null ? [] : uncertaintyAdvice(heats, floorLoad, context.workings),
  };
}

function sampled(model: LoadModel, { samples, seed, onProgress }: Sampling): LoadSamples {
  const run = sampleLoad(model, samples, seed);
  for (;;) {
    const step = run.next();
    if (step.done === true) return step.value;
    onProgress?.(step.value);
  }
}

function bandOfSamples(
  quantity: SampledQuantity,
  sorted: Float64Array,
  { seed }: Sampling,
  model: LoadModel,
  workings: boolean,
): UncertaintyBand {
  const N = sorted.length;
  const mean = sorted.reduce((sum, x) => sum + x, 0) / N;
  const deviation = Math.sqrt(sorted.reduce((sum, x) => sum + (x - mean) * (x - mean), 0) / N);
  const number = (value: number, step: string) =>
    modelEstimate(
      MONTE_CARLO_METHOD,
      quantity,
      { value },
      workings
        ? () => ({
            inputs: [
              { name: 'N', symbol: 'N', quantity: 'Samples', unit: '', value: N, origin: 'given' },
              {
                name: 'seed',
                symbol: 'seed',
                quantity: 'Where the random numbers begin',
                unit: '',
                value: seed,
                origin: 'given',
              },
              {
                name: 'masses',
                symbol: 'f_i',
                quantity: 'Masses drawn',
                unit: '',
                value: model.entries.length,
                origin: 'computed',
              },
              {
                name: 'heats',
                symbol: 'H_k',
                quantity: 'Materials drawn, one heat each',
                unit: '',
                value: model.materials.length,
                origin: 'computed',
              },
            ],
            steps: [
              { text: 'Mean of the samples', value: mean, unit: MONTE_CARLO_METHOD.outputs[quantity].unit },
              { text: 'Their standard deviation', value: deviation, unit: MONTE_CARLO_METHOD.outputs[quantity].unit },
              {
                text: 'Standard error of the mean',
                value: deviation / Math.sqrt(N),
                unit: MONTE_CARLO_METHOD.outputs[quantity].unit,
              },
              { text: step },
            ],
            assumptions: [...MONTE_CARLO_METHOD.assumptions, ...MONTE_CARLO_METHOD.limits],
          })
        : undefined,
    );
  const at = (percent: number) => {
    const rank = Math.ceil((percent * N) / 100);
    return number(sorted[rank - 1] ?? 0, `${percent} % of ${N} samples: number ${rank} in ascending order`);
  };
  return { p5: at(5), p50: at(50), p80: at(80), p95: at(95), mean: number(mean, 'The mean itself') };
}
