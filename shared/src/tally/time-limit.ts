import type { GrowthClass } from './growth-class.ts';
import type { RoomInput } from './room-input.ts';

/** Least heating time of the parametric curve by growth class, min; the annex stops at fast. */
const MINUTES: Readonly<Record<GrowthClass, number>> = { slow: 25, medium: 20, fast: 15, 'ultra-fast': 15 };

/** t_lim in hours: a person's own, or by growth class. */
export function timeLimit({ input, growth }: { readonly input: RoomInput; readonly growth: GrowthClass }): number {
  return (input.options?.time_limit_min ?? MINUTES[growth]) / 60;
}
