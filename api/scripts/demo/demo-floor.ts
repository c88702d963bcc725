import type { Entry, Lining, Opening, Protection } from '@embertally/shared/survey/survey-document';

/** How the demo's storeys are written down; `seed.ts` turns them into commands. Lengths in metres on wall centre lines. */
export interface DemoFloor {
  readonly name: string;
  readonly level_m: number;
  readonly height_m: number;
  readonly rooms: readonly DemoRoom[];
  readonly openings: readonly DemoOpening[];
}

export interface DemoRoom {
  readonly name: string;
  readonly use: string;
  readonly ring: readonly (readonly [number, number])[];
  readonly lining: Lining;
  readonly protection?: Partial<Protection>;
  readonly rating_min: number;
  readonly danger_of_activation?: number;
  readonly contents: readonly DemoEntry[];
}

/** An opening around a point of a wall. */
export type DemoOpening = { readonly at: readonly [number, number]; readonly kind: Opening['kind'] } & Partial<
  Pick<Opening, 'width_m' | 'height_m' | 'sill_m' | 'state' | 'label'>
>;

/** A kind of the catalogue, how many, where and how big the whole of it is. */
export type DemoEntry = {
  readonly kind: string;
  readonly label: string;
  readonly count: number;
  readonly at: readonly [number, number];
  readonly size: readonly [number, number, number];
} & Partial<Pick<Entry, 'evidence' | 'keeping' | 'peak_kW' | 'rotation_deg' | 'note' | 'base_height_m' | 'growth'>>;

export const MASONRY: Lining = {
  walls: { key: 'plastered-brick' },
  ceiling: { key: 'plastered-concrete' },
  floor: { key: 'concrete' },
};

export const UNDER_THE_ROOF: Lining = {
  walls: { key: 'plastered-brick' },
  ceiling: { key: 'gypsum-board-double' },
  floor: { key: 'concrete' },
};

/** What protects the whole building. */
export const BUILDING_PROTECTION: Protection = {
  sprinklers: null,
  independent_water_supplies: 0,
  detection: 'smoke',
  alarm_to_brigade: true,
  brigade: 'off-site',
  access_routes: 'normal',
  firefighting_devices: 'yes',
  stair_smoke_exhaust: 'not-applicable',
};
