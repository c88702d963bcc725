import { bombCalibration } from '../../methods/calorimetry/bomb-calibration.ts';
import { calibrationMean } from '../../methods/calorimetry/calibration-mean.ts';
import { formatNumber } from '../../units/format-number.ts';
import type { DraftOf } from '../material-draft.ts';
import type { Workbook } from '../workbook.ts';

/** Certified heat of benzoic acid for mass in vacuum, NIST SRM 39j, MJ/kg. */
export const BENZOIC_MJ_KG = 26.434;

interface WaterEquivalent {
  readonly value_MJ_K: number;
  /** Half the range of the calibration runs over their mean; 0 for a stated value. */
  readonly spread: number;
  readonly benzoic_MJ_kg: number;
}

/** Heat that warms the calorimeter by one kelvin: as stated, or from runs with benzoic acid. */
export function waterEquivalent(book: Workbook, { calibration }: DraftOf<'bomb'>): WaterEquivalent {
  if (calibration.by === 'given')
    return { value_MJ_K: calibration.water_equivalent_MJ_K, spread: 0, benzoic_MJ_kg: BENZOIC_MJ_KG };
  const H = calibration.benzoic_MJ_kg ?? BENZOIC_MJ_KG;
  const values = calibration.runs.map((run, i) => {
    const at = `/calibration/runs/${i}`;
    return book.run(
      bombCalibration,
      { m: run.mass_kg, H, b: run.fuse_MJ + (run.acid_MJ ?? 0), dT: run.rise_K },
      { at, inputs: { m: `${at}/mass_kg`, dT: `${at}/rise_K`, b: `${at}/fuse_MJ` } },
      {
        origins: { m: 'measured', dT: 'measured', b: 'measured', H: calibration.benzoic_MJ_kg ? 'given' : 'default' },
        steps: [{ text: `Calibration run ${i + 1}${run.acid_MJ ? '; b holds the heat of the acid too' : ''}` }],
      },
    );
  });
  const { mean, spread, accepted } = book.outputs(
    calibrationMean,
    { E: values },
    { at: '/calibration/runs' },
    ['mean'],
    { origins: { E: 'computed' } },
  );
  if (!accepted)
    book.warn(
      'CALIBRATION',
      values.length < 5
        ? `The calibration rests on ${values.length} ${values.length === 1 ? 'run' : 'runs'}; five are usual. Add runs, or state that the laboratory keeps more.`
        : `The calibration runs lie ${formatNumber(spread * 100, 2)} % apart; up to 0.5 % is usual. The range of the heat is widened by it.`,
    );
  return { value_MJ_K: mean, spread: spread / 2, benzoic_MJ_kg: H };
}
