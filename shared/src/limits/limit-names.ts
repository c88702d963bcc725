import type { Limit, LimitQuantity } from '../contracts/limits.ts';

/** What a limit bounds, as screens say it. */
export const limitNames: Readonly<Record<LimitQuantity, string>> = {
  load_per_floor_MJ_m2: 'Fire load density',
  load_total_MJ: 'Heat kept in the room',
  load_design_MJ_m2: 'Design fire load density',
  peak_kW: 'Peak heat release',
  equivalent_time_min: 'Equivalent time of exposure, as kept',
};

export const limitSourceNames: Readonly<Record<Limit['source'], string>> = {
  permit: 'Permit',
  policy: 'Policy clause',
  'house-rule': 'House rule',
};
