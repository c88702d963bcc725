import type { Storey } from './survey-document.ts';

/** A storey as it starts: at level 0 m, 3 m high, walls without thickness until somebody says how thick they are. */
export function newStorey(given: Pick<Storey, 'id' | 'name'> & Partial<Omit<Storey, 'id' | 'name'>>): Storey {
  return { level_m: 0, height_m: 3, wall_thickness_m: 0, plan_picture: null, north_deg: null, ...given };
}
