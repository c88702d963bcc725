import type { LimitQuantity } from '../contracts/limits.ts';

/** The SI unit each limit's bound is kept in, as the tally spells it. */
export const limitUnits: Readonly<Record<LimitQuantity, string>> = {
  load_per_floor_MJ_m2: 'MJ/m2',
  load_total_MJ: 'MJ',
  load_design_MJ_m2: 'MJ/m2',
  peak_kW: 'kW',
  equivalent_time_min: 'min',
};
