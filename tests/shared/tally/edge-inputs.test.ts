import { describe, expect, it } from 'vitest';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { parseRoomInput } from '@embertally/shared/tally/parse-room-input';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import { expectFinite } from './expect-finite.ts';

const plaster = { thickness_m: 0.016, conductivity_W_mK: 0.48, density_kg_m3: 1440, specific_heat_J_kgK: 840 };
const brick = { thickness_m: 0.12, conductivity_W_mK: 0.8, density_kg_m3: 1800, specific_heat_J_kgK: 850 };

/** A room in which every number that can be given is given. */
const FULL: RoomInput = {
  room: {
    name: 'Print shop',
    use: 'office',
    ring_m: [
      [0, 0],
      [9, 0],
      [9, 6],
      [0, 6],
    ],
    holes_m: [
      [
        [7, 4],
        [8, 4],
        [8, 5],
      ],
    ],
    height_m: 3.2,
    measured_floor_area_m2: 53.2,
    compartment_floor_m2: 60,
    lining: { walls: { layers: [plaster, brick] }, ceiling: { layers: [plaster] }, floor: { key: 'concrete' } },
    openings: [
      { width_m: 1.2, height_m: 2.1, sill_m: 0, state: 'open', leads_to: 'outside' },
      { width_m: 2, height_m: 1.2, sill_m: 0.9, state: 'fails', leads_to: 'outside' },
    ],
    roof_vents_m2: 0,
    protection: {
      sprinklers: { rti: 80, activation_C: 68, distance_m: 2.3 },
      independent_water_supplies: 1,
      detection: 'both',
    },
    danger_of_activation: 1,
    rating_min: 60,
  },
  contents: [
    {
      id: 'paper',
      count: 3,
      parts: [
        {
          net_heat_MJ_kg: 18,
          low_MJ_kg: 16,
          high_MJ_kg: 19,
          mass_kg: 250,
          basis: 'gross',
          water: 'dry',
          moisture_pct: 6,
          hydrogen_mass_fraction: 0.06,
        },
        { material: 'timber', mass_kg: 40, moisture_pct: 12 },
      ],
      x_m: 2,
      y_m: 2,
      rotation_deg: 15,
      base_height_m: 0.1,
      width_m: 1.2,
      depth_m: 0.8,
      height_m: 1.5,
      peak_kW: 900,
      radiative_fraction: 0.35,
      ignites_at_kW_m2: 12,
    },
    {
      id: 'chairs',
      count: 1,
      parts: [{ net_heat_MJ_kg: 25, mass_kg: 20, heat_basis: 'effective' }],
      curve: [
        [0, 0],
        [120, 900],
        [400, 300],
        [700, 0],
      ],
      x_m: 5,
      y_m: 3,
      width_m: 1,
      depth_m: 1,
      height_m: 1,
      enclosure: 'open',
    },
    { id: 'safe', count: 1, parts: [{ material: 'paper', mass_kg: 80 }], enclosure: 'sealed', sealed_rating_min: 90 },
  ],
  limits: [{ quantity: 'peak_kW', bound: 5000 }],
  options: {
    plateau_kW_m2: 250,
    fire_area_m2: 30,
    combustion_factor: 0.9,
    exposure_s: 1200,
    kb: 0.06,
    kc: 1.5,
    ambient_C: 20,
    time_limit_min: 20,
    seed: 7,
    samples: 100,
    first_entry: 'paper',
  },
};

const EDGES = [NaN, Infinity, -Infinity, -1, -1e-9, 0, 5e-324, 1e-9, 1e-3, 1e4, 1e9, 1e300];

/** The simulation takes most of the time; the smallest and the largest that are let in are enough for it. */
const WITH_SPREAD: ReadonlySet<number> = new Set([1e-9, 1e4]);

type Path = readonly (string | number)[];

/** Every number inside, by where it stands. */
function numbersIn(value: unknown, path: Path = []): Path[] {
  if (typeof value === 'number') return [path];
  if (Array.isArray(value)) return value.flatMap((inner, i) => numbersIn(inner, [...path, i]));
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => numbersIn(inner, [...path, key]));
}

function withNumber(path: Path, number: number): RoomInput {
  const copy = structuredClone(FULL);
  let at = copy as unknown as Record<string | number, unknown>;
  for (const step of path.slice(0, -1)) at = at[step] as Record<string | number, unknown>;
  at[path.at(-1)!] = number;
  return copy;
}

describe.each(numbersIn(FULL).map((path) => [`/${path.join('/')}`, path] as const))('%s', (pointer, path) => {
  it('is refused by its name or gives finite numbers only', () => {
    for (const edge of EDGES) {
      const parsed = parseRoomInput(withNumber(path, edge));
      if (parsed.ok) {
        expectFinite(estimateRoom(parsed.value, { workings: true, spread: WITH_SPREAD.has(edge) }), `${edge} $`);
        continue;
      }
      // A rule over several fields stands at one of them: an opening too tall for its room, a hole outside its ring.
      const near = pointer.split('/').slice(0, 2).join('/');
      for (const fault of parsed.errors) {
        expect(fault.message, `${edge}`).toMatch(/\.$/);
        expect(fault.message, `${edge}`).not.toMatch(/NaN|Infinity|undefined/);
      }
      const told = parsed.errors.some((fault) => fault.pointer.startsWith(near));
      expect(told, `${edge}: ${JSON.stringify(parsed.errors)}`).toBe(true);
    }
  });
});
