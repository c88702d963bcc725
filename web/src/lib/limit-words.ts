import type { Limit, LimitQuantity } from '@embertally/shared/contracts/limits';

/** What a limit bounds, in the trade's words, and the unit it is kept in. */
export const LIMIT_QUANTITIES: Readonly<Record<LimitQuantity, { readonly label: string; readonly unit: string }>> = {
  load_per_floor_MJ_m2: { label: 'Fire load density', unit: 'MJ/m2' },
  load_total_MJ: { label: 'Fire load', unit: 'MJ' },
  load_design_MJ_m2: { label: 'Design fire load density', unit: 'MJ/m2' },
  peak_kW: { label: 'Peak heat release', unit: 'kW' },
  equivalent_time_min: { label: 'Equivalent exposure', unit: 'min' },
};

export const LIMIT_SOURCES: Readonly<Record<Limit['source'], string>> = {
  permit: 'permit',
  policy: 'policy clause',
  'house-rule': 'house rule',
};
