import type { Limit } from '@embertally/shared/contracts/limits';
import type { SiteRoleName } from '@embertally/shared/policy/policy';

export type DemoLimit = Pick<Limit, 'quantity' | 'bound' | 'source' | 'set_by' | 'since'> & {
  readonly room: string;
  /** Whose sign-in enters it. */
  readonly as: SiteRoleName;
};

/** One room over its limit, two near, the rest within or without one. */
export const DEMO_LIMITS: readonly DemoLimit[] = [
  {
    room: 'Scenery dock',
    quantity: 'load_per_floor_MJ_m2',
    bound: 700,
    source: 'permit',
    set_by: 'Permit 12/7, clause 4',
    since: '2026-03-12',
    as: 'inspector',
  },
  {
    room: 'Costume store',
    quantity: 'load_per_floor_MJ_m2',
    bound: 720,
    source: 'permit',
    set_by: 'Permit 12/7, clause 5',
    since: '2026-03-12',
    as: 'inspector',
  },
  {
    room: 'Paint shop',
    quantity: 'load_per_floor_MJ_m2',
    bound: 600,
    source: 'permit',
    set_by: 'Permit 12/7, clause 6',
    since: '2026-03-12',
    as: 'inspector',
  },
  {
    room: 'Prop loft',
    quantity: 'load_per_floor_MJ_m2',
    bound: 500,
    source: 'policy',
    set_by: 'Policy wording, clause 4.2',
    since: '2026-01-01',
    as: 'reviewer',
  },
  {
    room: 'Archive',
    quantity: 'load_per_floor_MJ_m2',
    bound: 2000,
    source: 'house-rule',
    set_by: 'House rule of the trustees',
    since: '2025-11-03',
    as: 'manager',
  },
  {
    room: 'Loading bay',
    quantity: 'load_per_floor_MJ_m2',
    bound: 600,
    source: 'house-rule',
    set_by: 'House rule: no more than six pallets',
    since: '2025-11-03',
    as: 'manager',
  },
];
