import { formatNumber } from '../units/format-number.ts';
import type { CalorimeterChoices } from './calorimeter-choices.ts';
import type { CalorimeterNote } from './calorimeter-reading.ts';
import { curveBasis } from './curve-basis.ts';
import type { Curve } from './curve.ts';
import { curveTotals } from './curve-totals.ts';

/** Down to this share of the peak, readings below 0 are what an analyser does around 0. */
const NOISE = 0.05;

interface BelowZero {
  readonly curve: Curve;
  readonly undecided: boolean;
}

/** Readings below 0: said, explained, and set to 0 only where the person decided so. */
export function belowZero(curve: Curve, choices: CalorimeterChoices, notes: CalorimeterNote[]): BelowZero {
  const below = curve.rate.filter((q) => q < 0);
  if (below.length === 0) return { curve, undecided: false };
  const { negatives } = choices;
  const { heatUnit, rateUnit } = curveBasis(choices);
  const { heat_MJ, peak } = curveTotals(curve);
  const raised = { time_s: curve.time_s, rate: curve.rate.map((q) => Math.max(0, q)) };
  const added = curveTotals(raised).heat_MJ - heat_MJ;
  const lowest = below.reduce((least, q) => Math.min(least, q), 0);
  const noise = -lowest <= NOISE * peak;
  const what = `${below.length} ${below.length === 1 ? 'reading is' : 'readings are'} below 0, the lowest ${formatNumber(lowest, 3)} ${rateUnit}`;
  const why = noise
    ? `, ${formatNumber((-100 * lowest) / peak, 2)} % of the peak: the analyser’s noise around 0.`
    : ': more than noise. Check column, sign and baseline.';
  const result = `to 0 adds ${formatNumber(added, 3)} ${heatUnit} (${formatNumber((100 * added) / heat_MJ, 2)} %).`;
  notes.push({
    code: noise ? 'NOISE_BELOW_ZERO' : 'BELOW_ZERO',
    text:
      negatives === 'zero'
        ? `${what}${why} Setting them ${result}`
        : `${what}${why} To keep the curve, set them to 0; that ${result.replace('to 0 ', '')}`,
  });
  return negatives === 'zero' ? { curve: raised, undecided: false } : { curve, undecided: true };
}
