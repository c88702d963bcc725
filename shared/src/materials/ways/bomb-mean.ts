import { bombAcceptance } from '../../methods/calorimetry/bomb-acceptance.ts';
import { bombRun as bombRunMethod } from '../../methods/calorimetry/bomb-run.ts';
import { formatNumber } from '../../units/format-number.ts';
import { DraftRefused } from '../draft-refused.ts';
import type { DraftOf } from '../material-draft.ts';
import type { MaterialFault } from '../material-fault.ts';
import type { Workbook } from '../workbook.ts';
import { BENZOIC_MJ_KG, waterEquivalent } from './water-equivalent.ts';

const LEAST_RUNS = 3;

interface BombMean {
  /** Gross heat at constant volume of the sample as it was burnt, MJ/kg. */
  readonly gross_MJ_kg: number;
  /** Relative half-width that runs and calibration show. */
  readonly spread: number;
  readonly runs: number;
}

/** Mean of the runs that count. @throws DraftRefused with fewer than three of them, and where they disagree */
export function bombMean(book: Workbook, draft: DraftOf<'bomb'>): BombMean {
  const counted = draft.runs.map((run, i) => ({ run, i })).filter(({ run }) => run.left_out === undefined);
  const faults: MaterialFault[] = counted
    .filter(({ run }) => !(run.rise_K > 0))
    .map(({ run, i }) => ({
      pointer: `/runs/${i}/rise_K`,
      code: 'no_rise',
      message: `Run ${i + 1} shows a rise of ${formatNumber(run.rise_K, 3)} K: nothing burnt, or a reading is wrong. Check it, or leave the run out and say why.`,
    }));
  if (counted.length < LEAST_RUNS)
    faults.push({
      pointer: '/runs',
      code: 'too_few_runs',
      message: `At least three runs that count are needed; there ${counted.length === 1 ? 'is 1' : `are ${counted.length}`}. Add runs.`,
    });
  if (faults.length > 0) throw new DraftRefused(faults);
  const water = waterEquivalent(book, draft);
  const heats = counted.map(({ run, i }) => {
    const at = `/runs/${i}`;
    return book.run(
      bombRunMethod,
      {
        E: water.value_MJ_K,
        dT: run.rise_K,
        b: run.fuse_MJ,
        a: run.acid_MJ ?? 0,
        m_aid: run.aid_kg ?? 0,
        H_aid: water.benzoic_MJ_kg,
        m: run.mass_kg,
      },
      { at, inputs: { m: `${at}/mass_kg`, dT: `${at}/rise_K`, b: `${at}/fuse_MJ`, m_aid: `${at}/aid_kg` } },
      {
        origins: {
          E: draft.calibration.by === 'given' ? 'given' : 'computed',
          dT: 'measured',
          b: 'measured',
          a: run.acid_MJ === undefined ? 'default' : 'measured',
          m_aid: run.aid_kg === undefined ? 'default' : 'measured',
          H_aid: water.benzoic_MJ_kg === BENZOIC_MJ_KG ? 'default' : 'given',
          m: 'measured',
        },
        steps: [{ text: `Run ${i + 1}` }],
      },
    );
  });
  const mean = meanOfRuns(book, heats, counted);
  leftOut(book, draft);
  return mean.gross > 0
    ? { gross_MJ_kg: mean.gross, spread: mean.halfRange / mean.gross + water.spread, runs: heats.length }
    : { gross_MJ_kg: mean.gross, spread: 0, runs: heats.length };
}

function meanOfRuns(book: Workbook, heats: readonly number[], counted: readonly { readonly i: number }[]) {
  const { mean, range, allowed, accepted } = book.outputs(
    bombAcceptance,
    { PCS: heats },
    { at: '/runs' },
    ['range', 'mean'],
    { steps: [relativeDeviation(heats)] },
  );
  if (!accepted) {
    const farthest = heats.reduce(
      (far, heat, k) => (Math.abs(heat - mean) > Math.abs(heats[far]! - mean) ? k : far),
      0,
    );
    throw DraftRefused.at(
      '/runs',
      'runs_disagree',
      `The runs lie ${formatNumber(range, 3)} MJ/kg apart; EN ISO 1716 accepts ${formatNumber(allowed, 3)} here. Run ${counted[farthest]!.i + 1} (${formatNumber(heats[farthest]!, 3)} MJ/kg) is farthest from the mean of ${formatNumber(mean, 3)}. Check its mass and rise, add two runs, or leave a run out and say why.`,
    );
  }
  return { gross: mean, halfRange: range / 2 };
}

function relativeDeviation(heats: readonly number[]) {
  const mean = heats.reduce((sum, one) => sum + one, 0) / heats.length;
  const variance = heats.reduce((sum, one) => sum + (one - mean) ** 2, 0) / (heats.length - 1);
  return {
    text: 'Standard deviation of the runs over their mean',
    value: mean > 0 ? (100 * Math.sqrt(variance)) / mean : null,
    unit: '%',
  };
}

function leftOut(book: Workbook, { runs }: DraftOf<'bomb'>): void {
  for (const [i, run] of runs.entries())
    if (run.left_out !== undefined) book.warn('RUN_LEFT_OUT', `Run ${i + 1} does not count: ${run.left_out}`);
}
