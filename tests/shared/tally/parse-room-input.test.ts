import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseRoomInput } from '@embertally/shared/tally/parse-room-input';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { SCENERY_DOCK } from './scenery-dock.ts';

type Json = Record<string, unknown>;
const [flats] = SCENERY_DOCK.contents;

function faults(candidate: unknown): [string, string][] {
  const parsed = parseRoomInput(candidate);
  return parsed.ok ? [] : parsed.errors.map(({ pointer, code }) => [pointer, code]);
}
const room = (changes: Json) => ({ ...SCENERY_DOCK, room: { ...SCENERY_DOCK.room, ...changes } });
const entry = (changes: Json) => ({ ...SCENERY_DOCK, contents: [{ ...flats, ...changes }] });
const lining = (changes: Json) =>
  room({
    lining: {
      walls: {
        layers: [
          { thickness_m: 0.1, conductivity_W_mK: 0.5, density_kg_m3: 900, specific_heat_J_kgK: 900, ...changes },
        ],
      },
      ceiling: { key: 'concrete' },
      floor: { key: 'concrete' },
    },
  });
const part = (changes: Json) => entry({ parts: [{ net_heat_MJ_kg: 17, mass_kg: 1, ...changes }] });

describe('the input of an estimate', () => {
  it('is taken as it is when nothing is wrong, catalogue keys included', () => {
    const input = room({
      lining: { walls: { key: 'concrete' }, ceiling: { key: 'concrete' }, floor: { key: 'concrete' } },
    });
    const parsed = parseRoomInput({ ...input, contents: [{ ...flats, parts: [{ material: 'timber', mass_kg: 18 }] }] });
    if (!parsed.ok) throw new Error(JSON.stringify(parsed.errors));
    expect(estimateRoom(parsed.value).load.total.value).toBeGreaterThan(0);
  });

  it('needs only the ring, the height and a name', () => {
    const least = {
      room: {
        name: 'Closet',
        ring_m: [
          [0, 0],
          [1, 0],
          [1, 1],
        ],
        height_m: 2.4,
      },
      contents: [],
    };
    expect(faults(least)).toEqual([]);
  });

  it.each<[string, unknown, string, string]>([
    ['no input at all', null, '', 'wrong_type'],
    ['a text', 'room', '', 'wrong_type'],
    ['an unknown field', { ...SCENERY_DOCK, colour: 'red' }, '/colour', 'unknown_field'],
    ['an unknown field deep inside', part({ weight: 3 }), '/contents/0/parts/0/weight', 'unknown_field'],
    ['a number as text', room({ height_m: '3.6' }), '/room/height_m', 'wrong_type'],
    ['NaN', room({ height_m: NaN }), '/room/height_m', 'not_finite'],
    ['Infinity', part({ mass_kg: Infinity }), '/contents/0/parts/0/mass_kg', 'not_finite'],
    ['a negative mass', part({ mass_kg: -1 }), '/contents/0/parts/0/mass_kg', 'too_small'],
    ['a negative count', entry({ count: -4 }), '/contents/0/count', 'too_small'],
    ['a room without height', room({ height_m: 0 }), '/room/height_m', 'too_small'],
    [
      'an unknown state',
      room({ openings: [{ width_m: 1, height_m: 1, state: 'ajar' }] }),
      '/room/openings/0/state',
      'unknown_value',
    ],
    ['an unknown use', room({ use: 'moon base' }), '/room/use', 'unknown_key'],
    ['an unknown lining', room({ lining: { walls: { key: 'cheese' } } }), '/room/lining/walls/key', 'unknown_key'],
    ['an unknown material', part({ material: 'phlogiston' }), '/contents/0/parts/0/material', 'unknown_key'],
    ['a part without heat', entry({ parts: [{ mass_kg: 1 }] }), '/contents/0/parts/0', 'no_heat'],
    [
      'a gross heat without hydrogen',
      part({ basis: 'gross' }),
      '/contents/0/parts/0/hydrogen_mass_fraction',
      'missing',
    ],
    [
      'a gross heat with more hydrogen than it can burn',
      part({ net_heat_MJ_kg: 4, basis: 'gross', hydrogen_mass_fraction: 0.25 }),
      '/contents/0/parts/0/net_heat_MJ_kg',
      'no_net_heat',
    ],
    [
      'a gross heat that its water uses up',
      part({ net_heat_MJ_kg: 3, basis: 'gross', water: 'dry', moisture_pct: 70, hydrogen_mass_fraction: 0.06 }),
      '/contents/0/parts/0/net_heat_MJ_kg',
      'no_net_heat',
    ],
    ['a lining without thickness', lining({ thickness_m: 0 }), '/room/lining/walls/layers/0/thickness_m', 'too_small'],
    [
      'a lining thinner than paint',
      lining({ thickness_m: 1e-6 }),
      '/room/lining/walls/layers/0/thickness_m',
      'too_small',
    ],
    [
      'a lining that conducts nothing',
      lining({ conductivity_W_mK: 0 }),
      '/room/lining/walls/layers/0/conductivity_W_mK',
      'too_small',
    ],
    ['an exposure of nothing', { ...SCENERY_DOCK, options: { exposure_s: 0 } }, '/options/exposure_s', 'too_small'],
    [
      'an opening of no width',
      room({ openings: [{ width_m: 0, height_m: 1 }] }),
      '/room/openings/0/width_m',
      'too_small',
    ],
    [
      'a detector that never warms up',
      room({ protection: { sprinklers: { rti: Infinity, activation_C: 68 } } }),
      '/room/protection/sprinklers/rti',
      'not_finite',
    ],
    [
      'a detector infinitely far away',
      room({ protection: { sprinklers: { rti: 50, activation_C: 68, distance_m: Infinity } } }),
      '/room/protection/sprinklers/distance_m',
      'not_finite',
    ],
    [
      'a curve with two points at one time',
      entry({
        curve: [
          [0, 0],
          [10, 5],
          [10, 2],
        ],
      }),
      '/contents/0/curve/2',
      'not_rising',
    ],
    [
      'a curve below zero',
      entry({
        curve: [
          [0, 0],
          [10, -5],
        ],
      }),
      '/contents/0/curve/1/1',
      'too_small',
    ],
    [
      '1,001 t in one entry',
      entry({ count: 1001, parts: [{ net_heat_MJ_kg: 17, mass_kg: 1000 }] }),
      '/contents/0/count',
      'too_heavy',
    ],
    [
      'two points',
      room({
        ring_m: [
          [0, 0],
          [1, 0],
        ],
      }),
      '/room/ring_m',
      'too_small',
    ],
    [
      'a bow tie',
      room({
        ring_m: [
          [0, 0],
          [4, 4],
          [4, 0],
          [0, 4],
        ],
      }),
      '/room/ring_m',
      'self_crossing',
    ],
    [
      'a repeated point',
      room({
        ring_m: [
          [0, 0],
          [4, 0],
          [4, 0],
          [0, 4],
        ],
      }),
      '/room/ring_m',
      'self_crossing',
    ],
    [
      'a hole outside',
      room({
        holes_m: [
          [
            [20, 20],
            [21, 20],
            [21, 21],
          ],
        ],
      }),
      '/room/holes_m/0',
      'hole_outside',
    ],
    [
      'an opening above the ceiling',
      room({ openings: [{ width_m: 1, height_m: 3, sill_m: 1 }] }),
      '/room/openings/0/height_m',
      'too_tall',
    ],
    [
      'a curve that runs backwards',
      entry({
        curve: [
          [0, 0],
          [10, 5],
          [5, 2],
        ],
      }),
      '/contents/0/curve/2',
      'not_rising',
    ],
    ['too many samples', { ...SCENERY_DOCK, options: { samples: 100_001 } }, '/options/samples', 'too_large'],
    [
      'a limit of nothing',
      { ...SCENERY_DOCK, limits: [{ quantity: 'peak_kW', bound: 0 }] },
      '/limits/0/bound',
      'too_small',
    ],
    ['the same entry twice', { ...SCENERY_DOCK, contents: [flats, flats] }, '/contents/1/id', 'duplicate_id'],
  ])('refuses %s', (_name, candidate, pointer, code) => {
    expect(faults(candidate)).toContainEqual([pointer, code]);
  });

  it('lists every fault, not the first', () => {
    const bad = {
      ...SCENERY_DOCK,
      extra: 1,
      room: { ...SCENERY_DOCK.room, height_m: -1, name: 5 },
      contents: [{ ...flats, count: 'many', parts: [{ mass_kg: -3 }] }],
    };
    expect(
      faults(bad)
        .map(([pointer]) => pointer)
        .sort(),
    ).toEqual(['/contents/0/count', '/contents/0/parts/0/mass_kg', '/extra', '/room/height_m', '/room/name']);
  });

  it('takes a material of an organisation’s own when its heat was copied', () => {
    const own = '3f0e6f4c-6a58-4b8e-9a53-0f6f4f1f8a11';
    expect(faults(part({ material: own }))).toEqual([]);
    expect(faults(entry({ parts: [{ material: own, mass_kg: 1 }] }))).toHaveLength(1);
  });

  it('tells a person what is wrong in a sentence', () => {
    const parsed = parseRoomInput(entry({ count: 1001, parts: [{ net_heat_MJ_kg: 17, mass_kg: 1000 }] }));
    expect(parsed.ok ? [] : parsed.errors.map(({ message }) => message)).toEqual([
      'The entry weighs 1001 t; an entry of more than 1,000 t is not accepted. Check count and mass.',
    ]);
  });

  it('never throws and never lets anything but an input through', () => {
    fc.assert(
      fc.property(fc.anything(), (candidate) => {
        expect(parseRoomInput(candidate).ok).toBe(false);
      }),
      { numRuns: 500 },
    );
  });
});
