type CurvePoint = readonly [number, number];

/** Enough for what a measured curve says; each piece costs a look at every entry that could light. */
const MOST_POINTS = 61;

/**
 * A measured curve `[s, kW]` with rising times in at most 60 pieces. A longer one is averaged over equal spans of time, which
 * keeps the heat of every span.
 */
export function measuredCurve(points: readonly CurvePoint[]): readonly CurvePoint[] {
  if (points.length <= MOST_POINTS) return points;
  const from = points[0]![0];
  const span = (points.at(-1)![0] - from) / (MOST_POINTS - 1);
  const averaged: CurvePoint[] = [];
  let index = 1;
  for (let k = 0; k < MOST_POINTS - 1; k += 1) {
    const [start, end] = [from + k * span, from + (k + 1) * span];
    let heat = 0;
    let at = start;
    while (at < end && index < points.length) {
      const to = Math.min(end, points[index]![0]);
      heat += (to - at) * rateBetween(points[index - 1]!, points[index]!, (at + to) / 2);
      at = to;
      if (points[index]![0] <= end) index += 1;
    }
    averaged.push([start, heat / span], [end, heat / span]);
  }
  return averaged;
}

function rateBetween([t0, q0]: CurvePoint, [t1, q1]: CurvePoint, t: number): number {
  return q0 + ((q1 - q0) * (t - t0)) / (t1 - t0);
}
