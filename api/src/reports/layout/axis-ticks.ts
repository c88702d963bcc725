const STEPS = [1, 2, 2.5, 5, 10];

/**
 * Round values for an axis from 0 to at least `most`, about `count` of them, in steps of 1, 2, 2.5 or 5 times a power of
 * ten. `most` of 0 or less: one step of 1.
 */
export function axisTicks(most: number, count: number): number[] {
  const span = most > 0 && Number.isFinite(most) ? most : 1;
  const raw = span / Math.max(1, count);
  const power = 10 ** Math.floor(Math.log10(raw));
  const step = (STEPS.find((candidate) => candidate * power >= raw * (1 - 1e-9)) ?? 10) * power;
  const ticks: number[] = [];
  for (let index = 0; index * step < span * (1 + 1e-9) || ticks.length < 2; index++) {
    ticks.push(Number((index * step).toPrecision(12)));
  }
  const last = ticks.at(-1) ?? 0;
  if (last < span * (1 - 1e-9)) ticks.push(Number((last + step).toPrecision(12)));
  return ticks;
}
