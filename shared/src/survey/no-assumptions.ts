import type { Assumptions } from './survey-document.ts';

/** Every default of the tally stands. */
export const NO_ASSUMPTIONS: Assumptions = {
  growth: null,
  growth_convention: null,
  plateau_kW_m2: null,
  fire_area_m2: null,
  combustion_factor: null,
  load_basis: null,
  protected_loads: null,
  protected_loads_note: '',
  exposure_s: null,
  time_limit_min: null,
  kb: null,
  kc: null,
  ambient_C: null,
  first_entry: null,
};

/** Null when nothing is left that differs from the defaults, so that an untouched room stays as it was. */
export function assumptionsOrNone(assumptions: Assumptions): Assumptions | null {
  const names = Object.keys(NO_ASSUMPTIONS) as (keyof Assumptions)[];
  return names.every((name) => assumptions[name] === NO_ASSUMPTIONS[name]) ? null : assumptions;
}
