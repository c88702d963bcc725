import type { Curve } from './curve.ts';

interface Segment {
  readonly from: number;
  readonly to: number;
  /** Area between the curve and the straight line over the segment. */
  readonly area: number;
  /** The point farthest from that line. */
  readonly farthest: number;
}

/** Indices of at most `most` points, ends and peak among them, chosen one by one where the straight line misses most area. */
export function mostTellingPoints(curve: Curve, most: number): readonly number[] {
  const { rate } = curve;
  const last = rate.length - 1;
  const peak = rate.reduce((top, value, i) => (value > rate[top]! ? i : top), 0);
  const ends = [...new Set([0, peak, last])].sort((a, b) => a - b);
  const segments = ends.slice(1).map((to, i) => segment(curve, ends[i]!, to));
  let points = ends.length;
  while (points < most) {
    const worst = segments.reduce((best, one, i) => (one.area > segments[best]!.area ? i : best), 0);
    const { from, to, area, farthest } = segments[worst]!;
    if (area === 0) break;
    segments.splice(worst, 1, segment(curve, from, farthest), segment(curve, farthest, to));
    points += 1;
  }
  return [...segments.map(({ from }) => from), last];
}

function segment({ time_s, rate }: Curve, from: number, to: number): Segment {
  const slope = (rate[to]! - rate[from]!) / (time_s[to]! - time_s[from]!);
  let area = 0;
  let farthest = from;
  let distance = 0;
  let previous = 0;
  for (let i = from + 1; i <= to; i += 1) {
    const off = rate[i]! - (rate[from]! + slope * (time_s[i]! - time_s[from]!));
    area += ((Math.abs(off) + Math.abs(previous)) / 2) * (time_s[i]! - time_s[i - 1]!);
    if (i < to && Math.abs(off) > distance) {
      distance = Math.abs(off);
      farthest = i;
    }
    previous = off;
  }
  return { from, to, area: farthest === from ? 0 : area, farthest };
}
