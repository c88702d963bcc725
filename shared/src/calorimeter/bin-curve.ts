import type { Curve } from './curve.ts';
import { curveTotals } from './curve-totals.ts';

/** A long curve averaged over `bins` equal spans of time, each at the middle of its readings; both ends and the peak stay. */
export function binCurve(curve: Curve, bins: number): Curve {
  const { time_s, rate } = curve;
  const start = time_s[0]!;
  const span = time_s.at(-1)! - start;
  const { peak, peak_s } = curveTotals(curve);
  const times: number[] = [start];
  const rates: number[] = [rate[0]!];
  const put = (t: number, q: number) => {
    if (t > times.at(-1)!) {
      times.push(t);
      rates.push(q);
    }
  };
  let at = 1;
  for (let bin = 1; bin <= bins && at < rate.length - 1; bin += 1) {
    const end = start + (span * bin) / bins;
    let count = 0;
    let sumTime = 0;
    let sumRate = 0;
    let holdsPeak = false;
    for (; at < rate.length - 1 && time_s[at]! <= end; at += 1) {
      count += 1;
      sumTime += time_s[at]!;
      sumRate += rate[at]!;
      if (time_s[at] === peak_s) holdsPeak = true;
    }
    if (holdsPeak) put(peak_s, peak);
    else if (count > 0) put(sumTime / count, sumRate / count);
  }
  put(time_s.at(-1)!, rate.at(-1)!);
  return { time_s: Float64Array.from(times), rate: Float64Array.from(rates) };
}
