import { figure } from '../methods/figure.ts';
import { formatNumber } from '../units/format-number.ts';
import type { CalorimeterChoices } from './calorimeter-choices.ts';
import type { CalorimeterNote } from './calorimeter-reading.ts';
import { curveBasis } from './curve-basis.ts';
import type { Curve } from './curve.ts';
import { curveTotals } from './curve-totals.ts';

/** The curve from its time 0 on: the chosen start, or 0 in a file that begins before 0, or the file's own zero. */
export function fromStart(curve: Curve, choices: CalorimeterChoices, notes: CalorimeterNote[]): Curve {
  const begins = curve.time_s[0] ?? 0;
  const start = choices.start_s ?? (choices.units.time === 'clock' ? begins : 0);
  if (start === 0 && begins >= 0) return curve;
  const first = curve.time_s.findIndex((t) => t >= start);
  const cut = first === -1 ? curve.time_s.length : first;
  if (cut > 0) {
    const { heat_MJ } = curveTotals({ time_s: curve.time_s.slice(0, cut + 1), rate: curve.rate.slice(0, cut + 1) });
    notes.push({
      code: 'BEFORE_START',
      text: `${cut} readings before ${figure(start)} s are left out; they hold ${formatNumber(heat_MJ, 3)} ${curveBasis(choices).heatUnit}.`,
    });
  }
  return { time_s: curve.time_s.slice(cut).map((t) => t - start), rate: curve.rate.slice(cut) };
}
