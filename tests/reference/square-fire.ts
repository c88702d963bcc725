/** A t-squared fire as straight pieces of one second: the curve lies at most α/4 kW above the parabola. */
export function squareFire(
  alpha: number,
  seconds: number,
): { readonly t: readonly number[]; readonly Q: readonly number[] } {
  const t = Array.from({ length: seconds + 1 }, (_, i) => i);
  return { t, Q: t.map((time) => alpha * time * time) };
}
