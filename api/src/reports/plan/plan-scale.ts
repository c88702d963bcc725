import { POINTS_PER_METRE } from '../layout/theme.ts';

export interface PlanScale {
  /** 100 for 1:100. */
  readonly ratio: number;
  readonly pointsPerMetre: number;
}

const STEPS = [1, 1.25, 1.5, 2, 2.5, 3, 4, 5, 7.5];
const LARGEST = 20;

/**
 * The largest round scale, from 1:20 down, at which a plan of `width_m` × `depth_m` fits a box in points. The drawing is
 * true at that ratio when printed at 100 %.
 */
export function planScale(width_m: number, depth_m: number, boxWidth: number, boxHeight: number): PlanScale {
  const need = Math.max((width_m * POINTS_PER_METRE) / boxWidth, (depth_m * POINTS_PER_METRE) / boxHeight, LARGEST);
  const power = 10 ** Math.floor(Math.log10(need));
  const step = STEPS.find((candidate) => candidate * power >= need * (1 - 1e-9)) ?? 10;
  const ratio = Math.round(step * power);
  return { ratio, pointsPerMetre: POINTS_PER_METRE / ratio };
}
