import { standardCurve as method } from '@embertally/shared/methods/burnout/nominal-curves';

const STEPS = 60;

/** Points of the standard temperature–time curve from 0 to `end_min`, `[[min, °C], …]`, to compare a burn-out with. */
export function standardCurve(end_min: number): [number, number][] {
  return Array.from({ length: STEPS + 1 }, (_, step) => {
    const t = (end_min * step) / STEPS;
    return [t, method.run({ t })];
  });
}
