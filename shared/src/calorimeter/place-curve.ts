/**
 * A measured curve as an entry burns: a piece's curve times the count, a surface's times the area that burns. All pieces and
 * all of the surface are taken to burn at once, with the times of the test; that is the fastest they can be.
 *
 * @param points `[s, kW]` of one piece, or `[s, kW/m²]`
 * @param scale pieces, or m² of exposed surface; above 0
 */
export function placeCurve(
  points: readonly (readonly [number, number])[],
  scale: number,
): readonly (readonly [number, number])[] {
  return points.map(([t, q]) => [t, q * scale] as const);
}
