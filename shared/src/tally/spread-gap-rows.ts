import type { Estimate } from '../methods/estimate.ts';
import type { WorkingInput } from '../methods/working.ts';
import { modelEstimate } from '../spread/model-estimate.ts';
import type { SpreadInput } from '../spread/simulate-spread.ts';
import type { Gap } from '../spread/gap-line.ts';
import { pairInputs } from '../spread/pair-inputs.ts';
import { shortGaps } from '../spread/short-gaps.ts';
import type { SpreadGap } from '../spread/spread-gaps.ts';
import { GAP_METHOD } from '../methods/models/spread-method.ts';
import type { SpreadTally, SpreadTallyGap } from './room-tally.ts';
import type { TallyContext } from './tally-context.ts';

/** More rows than anybody could act upon; how many there are in all is said beside them. */
const MOST_ROWS = 200;

type Rows = Required<Pick<SpreadTally, 'gaps' | 'pairs' | 'pairsShort'>>;

/** The gaps that are smaller than enough, largest shortfall first; those that no distance would help come last. */
export function spreadGapRows(input: SpreadInput, context: TallyContext): Rows {
  const { pairs, short, gaps } = shortGaps(input, MOST_ROWS);
  const describe = context.workings ? inputsFor(input) : undefined;
  return { gaps: gaps.map((gap) => rowOf(gap, describe)), pairs, pairsShort: short };
}

type Describe = (gap: SpreadGap, k_f: number) => WorkingInput[];

function rowOf(gap: SpreadGap, describe: Describe | undefined): SpreadTallyGap {
  const number = (
    output: keyof typeof GAP_METHOD.outputs,
    { metres, never }: Gap,
    k_f: number,
    step: string,
  ): Estimate =>
    modelEstimate(
      GAP_METHOD,
      output,
      { value: metres, ...(never !== undefined && { never }) },
      describe && (() => ({ inputs: describe(gap, k_f), steps: [{ text: step }] })),
    );
  const { from, to } = gap;
  return {
    from,
    to,
    gap_m: number('asItStands', { metres: gap.gap_m }, 1, 'Clear distance between the footprints on the plan.'),
    just_not_m: number('justNot', gap.justNot, 1, 'Only the first one burns, by its own curve.'),
    enough_m: number('enough', gap.enough, 2, 'The same with twice the radiation.'),
    long_exposure_m: number(
      'longExposure',
      gap.longExposureEnough,
      2,
      'Twice the radiation of its peak, held for ever.',
    ),
  };
}

function inputsFor({ entries }: SpreadInput): Describe {
  const byId = new Map(entries.map((entry) => [entry.id, entry]));
  return ({ from, to }, k_f) => {
    const [source, target] = [byId.get(from), byId.get(to)];
    return source && target ? pairInputs(source, target, k_f) : [];
  };
}
