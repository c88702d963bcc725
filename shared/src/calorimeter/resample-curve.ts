import { binCurve } from './bin-curve.ts';
import type { Curve } from './curve.ts';
import { curveTotals } from './curve-totals.ts';
import { mostTellingPoints } from './most-telling-points.ts';

/** More readings than this are first averaged over equal spans of time. */
const WORKABLE = 6000;
const PASSES = 8;

/**
 * A curve of at most `most` points with the area of the original (within rounding) and its very peak. Points are kept where
 * leaving them out would change the area most; what still differs is spread over the points other than the peak.
 *
 * @param curve times rising, rates 0 or more; its rates are returned as they are when it is short enough
 * @param most at least 3
 */
export function resampleCurve(curve: Curve, most = 300): readonly (readonly [number, number])[] {
  const { time_s, rate } = curve;
  if (rate.length <= most) return [...rate].map((value, i) => [time_s[i]!, value] as const);
  const workable = rate.length > WORKABLE ? binCurve(curve, WORKABLE) : curve;
  const kept = mostTellingPoints(workable, most);
  const times = Float64Array.from(kept, (i) => workable.time_s[i]!);
  const rates = Float64Array.from(kept, (i) => workable.rate[i]!);
  const { heat_MJ, peak } = curveTotals(curve);
  keepArea({ time_s: times, rate: rates }, heat_MJ, peak);
  return [...rates].map((value, i) => [times[i]!, value] as const);
}

/** Scales all but the peak so that the area is `heat_MJ`; no point grows above the peak. */
function keepArea(curve: Curve, heat_MJ: number, peak: number): void {
  const { time_s, rate } = curve;
  const width = (i: number) => ((time_s[i + 1] ?? time_s[i]!) - (time_s[i - 1] ?? time_s[i]!)) / 2;
  for (let pass = 0; pass < PASSES; pass += 1) {
    const gap = heat_MJ * 1000 - curveTotals(curve).heat_MJ * 1000;
    if (Math.abs(gap) <= 1e-9 * heat_MJ * 1000) return;
    let movable = 0;
    for (let i = 0; i < rate.length; i += 1) if (rate[i]! < peak) movable += rate[i]! * width(i);
    if (movable === 0) return;
    const factor = Math.max(0, 1 + gap / movable);
    for (let i = 0; i < rate.length; i += 1) if (rate[i]! < peak) rate[i] = Math.min(peak, rate[i]! * factor);
  }
}
