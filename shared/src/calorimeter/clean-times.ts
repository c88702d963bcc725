import type { CalorimeterChoices } from './calorimeter-choices.ts';
import type { Curve } from './curve.ts';
import type { FaultList } from './fault-list.ts';

/** Readings with their line, before they are put in order. */
export interface RawCurve extends Curve {
  readonly lines: Float64Array;
}

/** Times in order: as they are, or mended where the person said so. Faults name the lines that go back or repeat. */
export function cleanTimes(raw: RawCurve, { order }: CalorimeterChoices, faults: FaultList): Curve {
  const { time_s, lines } = raw;
  let rising = true;
  for (let i = 1; i < time_s.length; i += 1) {
    if (time_s[i]! > time_s[i - 1]!) continue;
    rising = false;
    if (order === 'mend') break;
    const same = time_s[i] === time_s[i - 1];
    faults.add(lines[i]!, same ? 'time_repeated' : 'time_back', () =>
      same
        ? `The time ${time_s[i]!} s stands here a second time. Correct the file, or have readings of one time averaged.`
        : `The time goes back from ${time_s[i - 1]!} s to ${time_s[i]!} s. Correct the file, or have the readings put in order.`,
    );
  }
  return rising || order !== 'mend' ? raw : mended(raw);
}

function mended({ time_s, rate }: RawCurve): Curve {
  const order = Array.from(time_s.keys()).sort((a, b) => time_s[a]! - time_s[b]!);
  const times: number[] = [];
  const sums: number[] = [];
  const counts: number[] = [];
  for (const i of order) {
    if (times.at(-1) === time_s[i]) {
      sums[sums.length - 1]! += rate[i]!;
      counts[counts.length - 1]! += 1;
    } else {
      times.push(time_s[i]!);
      sums.push(rate[i]!);
      counts.push(1);
    }
  }
  return { time_s: Float64Array.from(times), rate: Float64Array.from(sums, (sum, i) => sum / counts[i]!) };
}
