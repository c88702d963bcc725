import type { Lining, Protection } from './survey-document.ts';

/** Protection nobody has looked at yet: nothing is credited for it. */
export const UNKNOWN_PROTECTION: Protection = {
  sprinklers: null,
  independent_water_supplies: null,
  detection: 'unknown',
  alarm_to_brigade: null,
  brigade: 'unknown',
  access_routes: 'unknown',
  firefighting_devices: 'unknown',
  stair_smoke_exhaust: 'unknown',
};

/** Surfaces nobody has named yet. */
export const UNKNOWN_LINING: Lining = { walls: null, ceiling: null, floor: null };
