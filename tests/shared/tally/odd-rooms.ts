import type { RoomInput } from '@embertally/shared/tally/room-input';
import { SCENERY_DOCK } from './scenery-dock.ts';

type Room = RoomInput['room'];
type Entry = RoomInput['contents'][number];

const square = (side: number): [number, number][] => [
  [0, 0],
  [side, 0],
  [side, side],
  [0, side],
];
const door = { width_m: 0.9, height_m: 2, sill_m: 0, state: 'open', leads_to: 'outside' } as const;
const concrete = { walls: { key: 'concrete' }, ceiling: { key: 'concrete' }, floor: { key: 'concrete' } };

const layer = (size: number) => ({
  layers: [
    { thickness_m: size, conductivity_W_mK: size, density_kg_m3: size, specific_heat_J_kgK: size },
    { thickness_m: size, conductivity_W_mK: size / 2, density_kg_m3: size, specific_heat_J_kgK: size },
    { thickness_m: size, conductivity_W_mK: size, density_kg_m3: size, specific_heat_J_kgK: size },
  ],
});
const [thick, thin] = [layer(10), layer(1e-6)];

function room(changes: Partial<Room>): Room {
  return { name: 'Room', ring_m: square(5), height_m: 2.7, lining: concrete, openings: [door], ...changes };
}

function entry(changes: Partial<Entry>): Entry {
  return { id: 'e', count: 1, parts: [{ net_heat_MJ_kg: 18, mass_kg: 100 }], ...changes };
}

/** Rooms that have broken such calculations before. */
export const ODD_ROOMS: Readonly<Record<string, RoomInput>> = {
  'an ordinary room': SCENERY_DOCK,
  'a room with a hole': {
    room: room({ ring_m: square(10), holes_m: [square(3).map(([x, y]) => [x + 2, y + 2])] }),
    contents: [entry({})],
  },
  'a concave room': {
    room: room({
      ring_m: [
        [0, 0],
        [6, 0],
        [6, 2],
        [2, 2],
        [2, 6],
        [0, 6],
      ],
    }),
    contents: [entry({ x_m: 1, y_m: 1, width_m: 1, depth_m: 1, rotation_deg: 30 })],
  },
  'no opening': { room: room({ openings: [] }), contents: [entry({ peak_kW: 500 })] },
  'no contents': { room: room({ use: 'office' }), contents: [] },
  'ten megawatts': {
    room: room({ ring_m: square(20), height_m: 4, openings: [{ ...door, width_m: 6, height_m: 3 }] }),
    contents: [entry({ count: 100, peak_kW: 10_000, growth: 'ultra-fast', width_m: 4, depth_m: 2, x_m: 10, y_m: 10 })],
    options: { plateau_kW_m2: 500 },
  },
  'a third of a square metre': {
    room: room({ ring_m: square(0.55), openings: [{ ...door, width_m: 0.3, height_m: 0.5 }] }),
    contents: [entry({})],
    options: { plateau_kW_m2: 250 },
  },
  'everything closed': {
    room: room({ openings: [{ ...door, state: 'closed' }], use: 'office' }),
    contents: [entry({})],
  },
  'glass only': {
    room: room({ openings: [{ width_m: 2, height_m: 1.2, sill_m: 0.9, state: 'fails' }], use: 'office' }),
    contents: [entry({ count: 10 })],
  },
  'a door open and a window that breaks': {
    room: room({ openings: [door, { width_m: 2, height_m: 1.2, sill_m: 0.9, state: 'fails' }], use: 'office' }),
    contents: [entry({ count: 10, x_m: 2, y_m: 2, width_m: 1, depth_m: 1 })],
  },
  'a hall': {
    room: room({
      ring_m: square(80),
      height_m: 12,
      openings: [{ ...door, width_m: 5, height_m: 4 }],
      roof_vents_m2: 40,
    }),
    contents: [entry({ count: 5000, growth: 'fast' })],
    options: { plateau_kW_m2: 1000 },
  },
  'entries without mass': { room: room({}), contents: [entry({ parts: [{ material: 'timber', mass_kg: 0 }] })] },
  'an entry without parts': { room: room({}), contents: [entry({ parts: [] })] },
  'unknown linings': { room: room({ lining: null }), contents: [entry({ peak_kW: 3000 })] },
  'openings as large as the walls': {
    room: room({ openings: [1, 2, 3, 4].map(() => ({ ...door, width_m: 5, height_m: 2.7 })) }),
    contents: [entry({ peak_kW: 3000 })],
  },
  'a door ajar': {
    room: room({ openings: [{ ...door, width_m: 0.05 }] }),
    contents: [entry({ peak_kW: 3000 })],
  },
  'everything as large as may be entered': {
    room: room({
      ring_m: [
        [-10_000, -10_000],
        [10_000, -10_000],
        [10_000, 10_000],
        [-10_000, 10_000],
      ],
      height_m: 100,
      openings: Array.from({ length: 500 }, () => ({ ...door, width_m: 1000, height_m: 100 })),
      roof_vents_m2: 100_000,
      lining: { walls: thick, ceiling: thick, floor: thick },
    }),
    contents: [
      entry({ count: 1e6, parts: [{ net_heat_MJ_kg: 150, mass_kg: 1 }], peak_kW: 1e6, width_m: 1000, depth_m: 1000 }),
    ],
  },
  'everything as small as may be entered': {
    room: room({
      ring_m: square(0.1),
      height_m: 1e-6,
      openings: [{ width_m: 1e-9, height_m: 1e-9, state: 'open' }],
      lining: { walls: thin, ceiling: thin, floor: thin },
      measured_floor_area_m2: 1e-9,
    }),
    contents: [
      entry({
        count: 1e-9,
        parts: [{ net_heat_MJ_kg: 1e-9, mass_kg: 1e-9 }],
        peak_kW: 1e-9,
        width_m: 1e-12,
        depth_m: 1e-12,
        x_m: 9999,
        y_m: 0,
      }),
    ],
    options: {
      exposure_s: 1e-6,
      time_limit_min: 1e-6,
      fire_area_m2: 1e-9,
      plateau_kW_m2: 1e-9,
      combustion_factor: 1e-9,
    },
  },
  'a keyhole': {
    room: room({ ring_m: square(0.5), openings: [{ width_m: 0.01, height_m: 0.01, state: 'open' }] }),
    contents: [entry({ peak_kW: 100 })],
  },
  'plastics and liquids in cabinets': {
    room: room({ use: 'workshop' }),
    contents: [
      entry({ id: 'a', enclosure: 'cabinet', parts: [{ material: 'polyethylene', mass_kg: 50 }] }),
      entry({ id: 'b', enclosure: 'sealed', parts: [{ material: 'petrol', mass_kg: 20 }] }),
      entry({ id: 'c', enclosure: 'sealed', sealed_rating_min: 90 }),
    ],
    options: { protected_loads: 'EN' },
  },
  'a ring without area': {
    room: room({
      ring_m: [
        [0, 0],
        [1, 0],
        [2, 0],
      ],
    }),
    contents: [entry({})],
  },
  'a measured curve': {
    room: room({ use: 'office' }),
    contents: [
      entry({
        curve: [
          [0, 0],
          [120, 800],
          [600, 0],
        ],
      }),
    ],
  },
};
