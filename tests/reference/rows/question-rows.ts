import type { RoomInputEntry, RoomInputLimit } from '@embertally/shared/tally/room-input';

interface Row {
  readonly id: string;
  readonly origin: 'independent' | 'invariant';
  readonly source: string;
}

/** How much more fits into the room of the worked example, from the definition of the load. */
export interface HowManyRow extends Row {
  readonly method: 'question.how-many';
  readonly further: RoomInputEntry;
  readonly by: 'pieces' | 'mass';
  readonly limit: Pick<RoomInputLimit, 'quantity' | 'bound'>;
  readonly keep: 'within' | 'not over';
  readonly expected: number;
  readonly tolerance: number;
}

/** The value of something about the room of the worked example at which a reading changes, solved by hand. */
export interface WhatChangesRow extends Row {
  readonly method: 'question.what-changes';
  readonly lever: 'opening-width' | 'opening-height' | 'opening-number' | 'room-height';
  readonly reading: 'governed-by' | 'regime' | 'flashover';
  readonly direction: 'more' | 'less';
  readonly expected: number;
  readonly tolerance: number;
}

/** 20 kg at 17.5 MJ/kg: 350 MJ a piece. */
const chair: RoomInputEntry = { id: 'further', count: 1, parts: [{ mass_kg: 20, net_heat_MJ_kg: 17.5 }] };
const goods: RoomInputEntry = { id: 'further', count: 1, parts: [{ mass_kg: 1, net_heat_MJ_kg: 17.5 }] };
const protectedGoods: RoomInputEntry = { ...goods, enclosure: 'cabinet' };

/** 40 × (18 kg × 16.8 + 2 kg × 16.3) MJ = 13 400 MJ on 12 m × 8 m. */
export const HOW_MANY_ROWS: readonly HowManyRow[] = [
  {
    id: 'pieces-to-bound',
    method: 'question.how-many',
    further: chair,
    by: 'pieces',
    limit: { quantity: 'load_per_floor_MJ_m2', bound: 200 },
    keep: 'not over',
    expected: 16,
    tolerance: 0,
    origin: 'independent',
    source: 'floor((200 × 96 − 13 400)/350) = floor(16.57), by hand',
  },
  {
    id: 'pieces-within',
    method: 'question.how-many',
    further: chair,
    by: 'pieces',
    limit: { quantity: 'load_per_floor_MJ_m2', bound: 200 },
    keep: 'within',
    expected: 11,
    tolerance: 0,
    origin: 'independent',
    source: 'floor((0.9 × 200 × 96 − 13 400)/350) = floor(11.09), by hand',
  },
  {
    id: 'exactly-on-the-bound',
    method: 'question.how-many',
    further: chair,
    by: 'pieces',
    limit: { quantity: 'load_total_MJ', bound: 13_400 + 5 * 350 },
    keep: 'not over',
    expected: 5,
    tolerance: 0,
    origin: 'independent',
    source: 'on the bound is not over it',
  },
  {
    id: 'mass-to-bound',
    method: 'question.how-many',
    further: goods,
    by: 'mass',
    limit: { quantity: 'load_per_floor_MJ_m2', bound: 200 },
    keep: 'not over',
    expected: 331.4286,
    tolerance: 0.001,
    origin: 'independent',
    source: '(200 × 96 − 13 400)/17.5, by hand',
  },
  {
    id: 'mass-in-a-cabinet',
    method: 'question.how-many',
    further: protectedGoods,
    by: 'mass',
    limit: { quantity: 'load_total_MJ', bound: 20_000 },
    keep: 'not over',
    expected: 443.6975,
    tolerance: 0.001,
    origin: 'independent',
    source: '(20 000 − 13 400)/(17.5 × 0.85), by hand',
  },
];

export const WHAT_CHANGES_ROWS: readonly WhatChangesRow[] = [
  {
    id: 'door-width-for-openings-to-govern',
    method: 'question.what-changes',
    lever: 'opening-width',
    reading: 'governed-by',
    direction: 'less',
    expected: 0.48028,
    tolerance: 0.001,
    origin: 'independent',
    source: 'fuel plateau 2500 kW = 1400 w 2.4^1.5, solved for w by hand',
  },
  {
    id: 'door-height-for-openings-to-govern',
    method: 'question.what-changes',
    lever: 'opening-height',
    reading: 'governed-by',
    direction: 'less',
    expected: 0.92723,
    tolerance: 0.001,
    origin: 'independent',
    source: '2500 = 1400 × 2 h^1.5, solved for h by hand',
  },
  {
    id: 'large-by-height',
    method: 'question.what-changes',
    lever: 'room-height',
    reading: 'regime',
    direction: 'more',
    expected: 6,
    tolerance: 0.0011,
    origin: 'invariant',
    source: 'a room of more than 6 m is taken as large',
  },
];
