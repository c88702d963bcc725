type CurvePoint = readonly [number, number];

/** Largest distance of a left-out point from the drawn line, as a share of the peak. */
const NEAREST = 0.0005;
/** Largest change of area in any drawn piece, as a share of it; so the whole keeps its area as well. */
const AREA = 0.0005;

/** A curve of `[s, kW]` with the points left out that a straight line replaces; its area stays within 0.05 %. */
export function thinCurve(points: readonly CurvePoint[]): readonly CurvePoint[] {
  if (points.length < 3) return points;
  const tolerance = NEAREST * points.reduce((peak, [, rate]) => Math.max(peak, rate), 0);
  const kept: CurvePoint[] = [points[0]!];
  let anchor = 0;
  let [steepest, flattest] = [Infinity, -Infinity];
  let area = 0;
  for (let i = 1; i < points.length; i += 1) {
    const [t0, q0] = points[anchor]!;
    const [t, q] = points[i]!;
    const last = points[i - 1]!;
    const grown = area + ((t - last[0]) * (q + last[1])) / 2;
    const slope = t > t0 ? (q - q0) / (t - t0) : Infinity;
    const straight = ((t - t0) * (q + q0)) / 2;
    const fits = slope <= steepest && slope >= flattest && Math.abs(straight - grown) <= AREA * grown;
    if (i - anchor > 1 && !(t > t0 && fits)) {
      kept.push(last);
      anchor = i - 1;
      [steepest, flattest, area] = [Infinity, -Infinity, 0];
      i -= 1;
      continue;
    }
    area = grown;
    if (t > t0) {
      steepest = Math.min(steepest, (q + tolerance - q0) / (t - t0));
      flattest = Math.max(flattest, (q - tolerance - q0) / (t - t0));
    }
  }
  kept.push(points.at(-1)!);
  return kept;
}
