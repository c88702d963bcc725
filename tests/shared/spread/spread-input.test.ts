import { describe, expect, it } from 'vitest';
import { ignitionOf } from '@embertally/shared/spread/ignition-class';
import { simulateSpread } from '@embertally/shared/spread/simulate-spread';
import { spreadInput } from '@embertally/shared/spread/spread-input';
import { entryHeats } from '@embertally/shared/tally/entry-heats';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { growthClass } from '@embertally/shared/tally/growth-class';
import { parseRoomInput } from '@embertally/shared/tally/parse-room-input';
import { roomAreas } from '@embertally/shared/tally/room-areas';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import { roomLinings } from '@embertally/shared/tally/room-linings';
import { roomOpenings } from '@embertally/shared/tally/room-openings';

const LAYER = { thickness_m: 0.016, conductivity_W_mK: 0.48, density_kg_m3: 1440, specific_heat_J_kgK: 840 };
const SIDE = { layers: [LAYER] };
const ROOM = {
  name: 'Property store',
  ring_m: [
    [0, 0],
    [5, 0],
    [5, 4],
    [0, 4],
  ],
  height_m: 2.7,
  lining: { walls: SIDE, ceiling: SIDE, floor: SIDE },
  openings: [{ width_m: 0.9, height_m: 2, state: 'open' }],
};

function parsed(contents: readonly object[], room: object = ROOM, options: object = {}): RoomInput {
  const result = parseRoomInput({ room, contents, options });
  if (!result.ok) throw new Error(JSON.stringify(result.errors));
  return result.value;
}

function made(input: RoomInput, oxygenLimitedHeat_MJ: number | null = null) {
  const context = { workings: false, missing: [] };
  const areas = roomAreas(input.room, context);
  const heats = entryHeats(input);
  return spreadInput({
    input,
    heats,
    areas,
    openings: roomOpenings(input.room, areas, context),
    linings: roomLinings(input.room),
    chosen: growthClass(input, heats),
    room: estimateRoom(input).room,
    oxygenLimitedHeat_MJ,
  });
}

const entry = (change: object = {}) => ({
  id: 'a',
  count: 1,
  parts: [{ net_heat_MJ_kg: 16, mass_kg: 100 }],
  x_m: 1,
  y_m: 1,
  width_m: 1,
  depth_m: 0.5,
  height_m: 1.5,
  growth: 'fast',
  peak_kW: 700,
  radiative_fraction: 0.3,
  ignition_class: 'hard',
  ...change,
});

function only(change: object) {
  const { input, defaults } = made(parsed([entry(change)]));
  return { entry: input.entries[0]!, codes: defaults.map(({ code }) => code) };
}

describe('the input of the spread of fire from a room', () => {
  it('takes what an entry says and assumes nothing', () => {
    const { input, defaults } = made(parsed([entry({ base_height_m: 0.4, rotation_deg: 30, ignites_at_kW_m2: 17 })]));
    expect(defaults).toEqual([]);
    expect(input.entries).toEqual([
      {
        id: 'a',
        place: { x_m: 1, y_m: 1, width_m: 1, depth_m: 0.5, rotation_deg: 30, base_m: 0.4, height_m: 1.5 },
        heat_MJ: 0.8 * 1600,
        peak_kW: 700,
        growth: { by: 't-squared', alpha_kW_s2: 1000 / 150 ** 2 },
        radiativeFraction: 0.3,
        ignition: { ...ignitionOf('hard'), critical_kW_m2: 17 },
        enclosure: 'open',
      },
    ]);
  });

  it('is about the room of the tally: areas, openings, criterion', () => {
    const { input } = made(parsed([entry()]), 77);
    const { room } = input;
    expect(room.liningArea_m2).toBeCloseTo(86.8, 9);
    expect(room.factorBefore).toBeCloseTo(1.8 * Math.SQRT2, 9);
    expect(room.factorAfter).toBeCloseTo(1.8 * Math.SQRT2, 9);
    expect(room.flashover_kW).toBeCloseTo(1570.5, 1);
    expect(room.surfaces?.map(({ area_m2 }) => Number(area_m2.toFixed(9)))).toEqual([46.8, 20, 20]);
    expect(room).toMatchObject({ ambient_C: 20, large: false, oxygenLimitedHeat_MJ: 77 });
  });

  it('holds as much heat as the design curve, in cabinets and with a factor for everything too', () => {
    const contents = [
      entry({ enclosure: 'cabinet' }),
      entry({ id: 'b', parts: [{ net_heat_MJ_kg: 40, mass_kg: 30, cellulosic: false }] }),
      entry({ id: 'c', enclosure: 'sealed', sealed_rating_min: 60 }),
    ];
    for (const options of [{}, { combustion_factor: 0.9 }]) {
      const input = parsed(contents, ROOM, options);
      const heat = made(input).input.entries.reduce((sum, one) => sum + one.heat_MJ, 0);
      expect(heat).toBeCloseTo(estimateRoom(input).growth.heatReleased!.value!, 9);
    }
  });

  it('counts broken glass from the start where nothing is open', () => {
    const openings = [{ width_m: 0.9, height_m: 2, state: 'fails' }];
    const { input } = made(parsed([entry()], { ...ROOM, openings }));
    expect(input.room.factorBefore).toBeCloseTo(1.8 * Math.SQRT2, 9);
    const both = [{ width_m: 0.9, height_m: 2, state: 'open' }, ...openings];
    const two = made(parsed([entry()], { ...ROOM, openings: both })).input.room;
    expect(two.factorAfter).toBeCloseTo(2 * two.factorBefore, 9);
  });

  it('knows no layer without linings, no criterion in a large or a closed room', () => {
    expect(made(parsed([entry()], { ...ROOM, lining: null })).input.room.surfaces).toBeNull();
    const large = made(parsed([entry()], { ...ROOM, height_m: 7 })).input.room;
    expect(large).toMatchObject({ large: true, flashover_kW: null });
    const closed = made(parsed([entry()], { ...ROOM, openings: [] })).input.room;
    expect(closed).toMatchObject({ factorBefore: 0, factorAfter: 0, flashover_kW: null });
  });

  it('passes on the first entry and the convention', () => {
    const options = { first_entry: 'a', growth_convention: 'NFPA', ambient_C: 5 };
    const { input } = made(parsed([entry()], ROOM, options));
    expect(input).toMatchObject({ first: 'a', fluxFactor: 1, ignition: 'dose' });
    expect(input.room.ambient_C).toBe(5);
    expect(input.flashoverGrowth_kW_s2).toBeCloseTo(1055 / 75 ** 2, 12);
    expect(input.entries[0]!.growth).toEqual({ by: 't-squared', alpha_kW_s2: 1055 / 150 ** 2 });
  });
});

describe('an entry that does not say everything', () => {
  it.each([
    ['PEAK_FROM_FOOTPRINT', { peak_kW: null }, { peak_kW: 250 }],
    ['PEAK_FROM_HEAT', { peak_kW: null, width_m: null }, { peak_kW: 1_280_000 / 1200 }],
    ['RADIATIVE_FRACTION_USUAL', { radiative_fraction: null }, { radiativeFraction: 0.35 }],
    ['IGNITION_NORMAL', { ignition_class: null }, { ignition: ignitionOf('normal') }],
    ['SEAL_NOT_RATED', { enclosure: 'sealed' }, { enclosure: 'open' }],
    ['NOT_ON_PLAN', { x_m: null }, { place: null }],
    ['HEIGHT_USUAL', { height_m: null }, { place: { height_m: 1 } }],
    ['FOOTPRINT_FROM_PEAK', { depth_m: null, peak_kW: 2000 }, { place: { width_m: 1, depth_m: 2 } }],
    ['GROWTH_FROM_ROOM', { growth: null }, { growth: { by: 't-squared', alpha_kW_s2: 1000 / 300 ** 2 } }],
  ] as const)('%s', (code, change, expected) => {
    const { entry: one, codes } = only(change);
    expect(codes).toContain(code);
    expect(one).toMatchObject(expected);
  });

  it('takes from its kind what the catalogue has: a chair of foam', () => {
    const { entry: one, codes } = only({
      kind: 'upholstered-chair',
      peak_kW: null,
      growth: null,
      ignition_class: null,
      radiative_fraction: null,
    });
    expect(codes).toEqual(['GROWTH_FROM_KIND', 'PEAK_FROM_KIND', 'RADIATIVE_FRACTION_FROM_KIND', 'IGNITION_FROM_KIND']);
    expect(one.peak_kW).toBeCloseTo((1670 / (0.8 * 0.85)) * 0.5, 9);
    expect(one).toMatchObject({ radiativeFraction: 0.45, ignition: ignitionOf('normal') });
    expect(one.growth).toEqual({ by: 't-squared', alpha_kW_s2: 1000 / 150 ** 2 });
  });

  it('of liquid burns at its peak from the start, of a material it lights like the material', () => {
    const { entry: one, codes } = only({
      growth: null,
      ignition_class: null,
      parts: [{ material: 'acetone', mass_kg: 40 }],
    });
    expect(codes).toEqual(['GROWTH_AT_ONCE', 'IGNITION_FROM_MATERIAL']);
    expect(one.growth).toEqual({ by: 'step' });
  });

  it.each([
    [128, []],
    [256, ['CURVE_STRETCHED']],
  ])('with a measured curve burns by it: %f MJ of its own', (mass_kg, codes) => {
    const curve = [
      [0, 0],
      [128, 1000],
      [256, 0],
    ];
    const parts = [{ net_heat_MJ_kg: 1, mass_kg, heat_basis: 'effective' }];
    const measured = only({ curve, parts, growth: null, peak_kW: null });
    expect(measured.entry).toMatchObject({
      heat_MJ: mass_kg,
      peak_kW: 1000,
      growth: { by: 'measured', points: curve },
    });
    expect(measured.codes).toEqual(codes);
  });

  it.each([0, 0.001])('with a measured curve of another order of heat goes by peak and class: %f kW', (rate) => {
    const curve = [
      [0, 0],
      [60, rate],
      [90, 0],
    ];
    const { entry: one, codes } = only({ curve });
    expect(one).toMatchObject({ peak_kW: 700, growth: { by: 't-squared' } });
    expect(codes).toEqual(['CURVE_NOT_USED']);
  });

  it('lists a default once, with every entry it was used for', () => {
    const { defaults } = made(parsed([entry({ peak_kW: null }), entry({ id: 'b', peak_kW: null })]));
    expect(defaults).toMatchObject([{ code: 'PEAK_FROM_FOOTPRINT', entryIds: ['a', 'b'] }]);
    expect(defaults[0]!.text).toContain('500 kW/m2');
  });
});

describe('a whole room', () => {
  it('burns as the same room written out by hand: the chain that ends in flashover', () => {
    const whole = (id: string, x: number, y: number, w: number, d: number, E: number, peak: number, growth: string) =>
      entry({
        id,
        x_m: x,
        y_m: y,
        width_m: w,
        depth_m: d,
        peak_kW: peak,
        growth,
        radiative_fraction: 0.35,
        ignition_class: 'normal',
        parts: [{ net_heat_MJ_kg: 1, mass_kg: E, heat_basis: 'effective' }],
      });
    const contents = [
      whole('A', 0.6, 0.6, 0.9, 0.9, 300, 1500, 'fast'),
      whole('B', 2.6, 0.6, 2, 0.9, 800, 2500, 'fast'),
      { ...whole('C', 4.7, 3, 0.4, 1.8, 1500, 1200, 'medium'), ignition_class: 'hard' },
    ];
    const { input } = made(parsed(contents, ROOM, { first_entry: 'A' }));
    const result = simulateSpread(input)!;
    expect(result.events.map(({ id, cause }) => [id, cause])).toEqual([
      ['A', 'first'],
      ['B', 'radiation'],
      ['C', 'flashover'],
    ]);
    expect(result.events[1]!.t).toBeCloseTo(140.57, 1);
    expect(result.flashover_s).toBeCloseTo(183.1, 1);
  });
});
