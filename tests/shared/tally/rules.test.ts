import { describe, expect, it } from 'vitest';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import { SCENERY_DOCK } from './scenery-dock.ts';

type Options = NonNullable<RoomInput['options']>;
type Entry = RoomInput['contents'][number];
const [flats] = SCENERY_DOCK.contents as [Entry];

function dock(changes: {
  room?: Partial<RoomInput['room']>;
  entries?: readonly Partial<Entry>[];
  options?: Options;
  limits?: RoomInput['limits'];
}): RoomInput {
  return {
    ...SCENERY_DOCK,
    room: { ...SCENERY_DOCK.room, ...changes.room },
    contents: changes.entries?.map((entry, i) => ({ ...flats, id: String(i), ...entry })) ?? SCENERY_DOCK.contents,
    options: { ...SCENERY_DOCK.options, ...changes.options },
    limits: changes.limits ?? SCENERY_DOCK.limits,
  };
}
const codes = (estimate: { warnings: readonly { code: string }[] } | undefined) =>
  estimate?.warnings.map(({ code }) => code) ?? [];
const whyMissing = (input: RoomInput, path: string) =>
  estimateRoom(input).missing.find((one) => one.path === path)?.why;
const door = { width_m: 2, height_m: 2.4, sill_m: 0, leads_to: 'outside' } as const;

describe('what is enclosed', () => {
  const counted = (changes: Partial<Entry>, options: Options = {}) =>
    estimateRoom(dock({ entries: [{ count: 1, ...changes }], options })).load.total.value;
  const heat = 100 * 17;
  const parts = [{ net_heat_MJ_kg: 17, mass_kg: 100 }];

  it.each<[string, Partial<Entry>, number]>([
    ['open counts in full', { enclosure: 'open' }, 1],
    ['a closed cabinet counts 85 %', { enclosure: 'cabinet' }, 0.85],
    ['sealed with a rating counts nothing', { enclosure: 'sealed', sealed_rating_min: 60 }, 0],
    ['sealed without a rating counts in full', { enclosure: 'sealed', sealed_rating_min: null }, 1],
  ])('%s', (_name, changes, factor) => {
    expect(counted({ parts, ...changes })).toBeCloseTo(factor * heat, 9);
  });

  it('a liquid counts in full in a cabinet without a rating', () => {
    const liquid = [{ material: 'petrol', net_heat_MJ_kg: 43.7, mass_kg: 10 }];
    expect(counted({ parts: liquid, enclosure: 'cabinet' })).toBeCloseTo(437, 6);
  });

  it('by the EN rule, the largest of three cabinets counts and the others do not', () => {
    const cabinets = [100, 60, 40].map((mass_kg) => ({
      count: 1,
      enclosure: 'cabinet' as const,
      parts: [{ net_heat_MJ_kg: 10, mass_kg }],
    }));
    const { load } = estimateRoom(dock({ entries: cabinets, options: { protected_loads: 'EN' } }));
    expect(load.byEntry.map((share) => share.heat.value)).toEqual([1000, 0, 0]);
    expect(codes(load.total)).toContain('PROTECTED_LOADS_EN_RULE');
  });
});

describe('the combustion factor', () => {
  it('is weighted by heat over cellulosic and other parts', () => {
    const entries = [
      { count: 1, parts: [{ material: 'timber', net_heat_MJ_kg: 10, mass_kg: 30 }] },
      { count: 1, parts: [{ material: 'polyethylene', net_heat_MJ_kg: 10, mass_kg: 10 }] },
    ];
    const { load } = estimateRoom(dock({ entries, options: { combustion_factor: null } }));
    expect(load.combustionFactor.value).toBeCloseTo((0.8 * 300 + 100) / 400, 12);
  });
  it('is one for a heat that a person calls not cellulosic', () => {
    const entries = [{ count: 1, parts: [{ net_heat_MJ_kg: 10, mass_kg: 30, cellulosic: false }] }];
    expect(estimateRoom(dock({ entries, options: { combustion_factor: null } })).load.combustionFactor.value).toBe(1);
  });
});

describe('the heat of a part', () => {
  const heatOf = (part: Entry['parts'][number]) =>
    estimateRoom(dock({ entries: [{ count: 1, parts: [part] }] })).load.total.value ?? 0;

  it('with its moisture: the exact balance on the wet basis', () => {
    expect(heatOf({ net_heat_MJ_kg: 19, moisture_pct: 10, mass_kg: 1 })).toBeCloseTo(16.856, 3);
  });
  it('given gross: less the water of its hydrogen', () => {
    expect(heatOf({ net_heat_MJ_kg: 47.7, basis: 'gross', hydrogen_mass_fraction: 0.14372, mass_kg: 1 })).toBeCloseTo(
      44.563,
      2,
    );
  });
  it('as received: as it is', () => {
    expect(heatOf({ net_heat_MJ_kg: 16, water: 'as_received', moisture_pct: 12, mass_kg: 1 })).toBeCloseTo(16, 12);
  });
});

describe('the load that is characteristic', () => {
  it('as surveyed, with a warning', () => {
    expect(codes(estimateRoom(SCENERY_DOCK).load.asKept)).toContain('SURVEY_TAKEN_AS_CHARACTERISTIC');
  });
  it('a mean: variable load times 1.216, fixed load as it is', () => {
    const entries = [{ count: 10 }, { count: 10, keeping: 'fixed' as const }];
    const { load } = estimateRoom(dock({ entries, options: { load_basis: 'mean' } }));
    const half = 10 * (18 * 16.8 + 2 * 16.3);
    expect(load.asKept?.value).toBeCloseTo((0.8 * half * (2 + 0.7195 * 0.3)) / 96, 6);
    expect(codes(load.asKept)).not.toContain('SURVEY_TAKEN_AS_CHARACTERISTIC');
  });
  it('unknown protection: no credit, and what is assumed present is said', () => {
    const { load } = estimateRoom(dock({ room: { protection: null } }));
    expect(load.design?.value).toBeCloseTo(111.667 * 1.2262, 2);
    expect(codes(load.design)).toContain('MEASURE_ASSUMED_PRESENT');
  });
  it('the compartment, not the room, sets the factor for size', () => {
    const { load } = estimateRoom(dock({ room: { compartment_floor_m2: 250, protection: null } }));
    expect(load.design?.value).toBeCloseTo(111.667 * 1.5, 2);
  });
  it('a danger of activation that is not in the table is used with a warning', () => {
    const { load } = estimateRoom(dock({ room: { danger_of_activation: 1.3 } }));
    expect(codes(load.design)).toContain('DANGER_NOT_IN_TABLE');
  });
});

describe('the place among rooms of the same use', () => {
  it('leaves fixed load out: a theatre at its 80 % value', () => {
    const kg = (364.75 * 96) / 10;
    const entries = [
      { count: 1, parts: [{ net_heat_MJ_kg: 10, mass_kg: kg }] },
      { count: 1, keeping: 'fixed' as const, parts: [{ net_heat_MJ_kg: 10, mass_kg: 5000 }] },
    ];
    expect(estimateRoom(dock({ entries })).load.placeAmongUse?.value).toBeCloseTo(80, 1);
  });
  it('is missing for a use without a survey, and says so', () => {
    expect(whyMissing(dock({ room: { use: 'storage' } }), 'load.placeAmongUse')).toMatch(/No survey/);
    expect(whyMissing(dock({ room: { use: null } }), 'load.placeAmongUse')).toMatch(/not stated/);
  });
});

describe('the openings', () => {
  it('glass alone is taken as broken from the start, with a warning', () => {
    const { room } = estimateRoom(dock({ room: { openings: [{ ...door, state: 'fails' }] } }));
    expect(room.ventilationFactor?.value).toBeCloseTo(7.4361, 4);
    expect(codes(room.ventilationFactor)).toContain('GLASS_ASSUMED_BROKEN');
    expect(codes(room.flashover.thomas)).toContain('GLASS_ASSUMED_BROKEN');
  });
  it('before the glass breaks the room is judged on what is open, the plateau on both', () => {
    const openings = [
      { ...door, state: 'open' as const },
      { ...door, state: 'fails' as const },
    ];
    const { room, growth } = estimateRoom(dock({ room: { openings } }));
    expect(room.ventilationFactor?.value).toBeCloseTo(7.4361, 4);
    expect(room.ventilationFactorAfterGlass?.value).toBeCloseTo(14.8722, 3);
    expect(growth.openingsPlateau?.value).toBeCloseTo(1400 * 14.8722, 0);
    expect(room.flashover.thomas?.value).toBeCloseTo(7.8 * 331.2 + 378 * 7.4361, 0);
  });
  it('a window says by its kind that it fails, a door that it is closed', () => {
    const openings = [
      { kind: 'window' as const, width_m: 2, height_m: 2.4 },
      { kind: 'door' as const, width_m: 2, height_m: 2.4 },
    ];
    const { room } = estimateRoom(dock({ room: { openings } }));
    expect(room.ventilationFactorAfterGlass?.value).toBeCloseTo(7.4361, 4);
  });
  it('an open door to the next room counts, with a note', () => {
    const { room } = estimateRoom(dock({ room: { openings: [{ ...door, state: 'open', leads_to: 'inside' }] } }));
    expect(codes(room.ventilationFactor)).toContain('OPENING_TO_INSIDE');
  });
  it('none: the curve runs on the fuel, the room is closed and burn-out is missing', () => {
    const closed = dock({ room: { openings: [{ ...door, state: 'closed' }] } });
    const { room, growth, burnout } = estimateRoom(closed);
    expect(room.regime).toBe('closed');
    expect(growth.governedBy).toBe('closed');
    expect(growth.peak?.value).toBe(2500);
    expect(codes(growth.peak)).toContain('NO_OPENING');
    expect(room.flashover.time).toBeUndefined();
    expect(burnout).toEqual({});
    expect(whyMissing(closed, 'room.ventilationLimit')).toMatch(/No opening/);
  });
});

describe('flashover', () => {
  const strong = { entries: [{ peak_kW: 20_000, growth: 'fast' as const }], options: { growth: null } };

  it('comes when the design curve reaches the lowest criterion that applies', () => {
    const { room, growth } = estimateRoom(dock(strong));
    const lowest = Math.min(...[5394.2, 5577.1, 8471.7]);
    expect(growth.alpha?.value).toBeCloseTo(1000 / 150 ** 2, 12);
    expect(room.flashover.time?.value).toBeCloseTo(Math.sqrt(lowest / (1000 / 150 ** 2)), 1);
    expect(room.hotLayer?.value).toBeCloseTo(218.4 * (lowest / 2500) ** (2 / 3), 0);
  });
  it('a door ajar does not flash over at a few kilowatts: criteria out of range or reach do not apply', () => {
    const { room } = estimateRoom(
      dock({ ...strong, room: { openings: [{ width_m: 0.05, height_m: 2, state: 'open' }] } }),
    );
    expect(room.flashover.babrauskas).toMatchObject({ applicable: false });
    expect(room.flashover.thomas).toMatchObject({ applicable: false });
    expect(room.flashover.time?.value).toBeNull();
    expect(room.regime).toBe('closed');
  });
  it('is missing in a large hall', () => {
    const hall = dock({
      ...strong,
      room: {
        ring_m: [
          [0, 0],
          [30, 0],
          [30, 20],
          [0, 20],
        ],
      },
    });
    expect(estimateRoom(hall).room.regime).toBe('large');
    expect(whyMissing(hall, 'room.flashover.thomas')).toMatch(/large/);
    expect(whyMissing(hall, 'room.hotLayer')).toMatch(/large/);
  });
  it('without linings only the third criterion and the hot layer are missing', () => {
    const bare = dock({ ...strong, room: { lining: { walls: SCENERY_DOCK.room.lining?.walls ?? null } } });
    const { flashover } = estimateRoom(bare).room;
    expect(flashover.thomas?.applicable).toBe(true);
    expect(flashover.mqh).toBeUndefined();
    expect(whyMissing(bare, 'room.flashover.mqh')).toMatch(/ceiling, floor/);
    expect(whyMissing(bare, 'room.hotLayer')).toMatch(/ceiling/);
  });
  it('warns of a roof vent the method does not know', () => {
    const { room } = estimateRoom(dock({ ...strong, room: { roof_vents_m2: 2 } }));
    expect(codes(room.flashover.thomas)).toContain('ROOF_VENT_NOT_IN_METHOD');
  });
});

describe('growth and plateaus', () => {
  it('an entry with less than 5 % of the load does not set the pace', () => {
    const entries = [
      { count: 100, growth: 'slow' as const },
      { count: 1, growth: 'ultra-fast' as const },
    ];
    const { growth } = estimateRoom(dock({ entries, options: { growth: null } }));
    expect(growth.alpha?.value).toBeCloseTo(1000 / 600 ** 2, 12);
  });
  it('falls back on the use, then on medium with a warning', () => {
    const entries = [{ growth: null }];
    const theatre = estimateRoom(dock({ entries, options: { growth: null } })).growth.alpha;
    expect(theatre?.value).toBeCloseTo(1000 / 150 ** 2, 12);
    const unknown = estimateRoom(dock({ entries, room: { use: null }, options: { growth: null } })).growth.alpha;
    expect(unknown?.value).toBeCloseTo(1000 / 300 ** 2, 12);
    expect(codes(unknown)).toContain('GROWTH_ASSUMED');
  });
  it('few footprints without peaks: rate per area times footprints', () => {
    const { growth } = estimateRoom(dock({ entries: [{ peak_kW: null }] }));
    expect(growth.fuelPlateau?.value).toBeCloseTo(250 * 2.4 * 1.2, 9);
  });
  it('a stated fire area counts instead, not above the peaks', () => {
    expect(estimateRoom(dock({ options: { fire_area_m2: 8 } })).growth.fuelPlateau?.value).toBe(2000);
    expect(estimateRoom(dock({ options: { fire_area_m2: 80 } })).growth.fuelPlateau?.value).toBe(2500);
  });
  it('wide footprints make the whole floor the fire area', () => {
    const { growth } = estimateRoom(dock({ entries: [{ width_m: 6, depth_m: 5, peak_kW: null }] }));
    expect(growth.fuelPlateau?.value).toBe(250 * 96);
    expect(growth.governedBy).toBe('openings');
    // Worked by an independent implementation.
    expect(growth.growthEnd?.value).toBeCloseTo(967.96, 1);
    expect(growth.decayStart?.value).toBeCloseTo(1366.1, 0);
    expect(growth.end?.value).toBeCloseTo(1983.9, 0);
  });
  it('a small load never reaches the plateau', () => {
    const { growth } = estimateRoom(dock({ entries: [{ count: 2, width_m: 6, depth_m: 5, peak_kW: null }] }));
    expect(growth.governedBy).toBe('load');
    expect(growth.growthEnd?.value).toBe(growth.decayStart?.value);
  });
  it('a measured curve stands for its entry: its peak counts and it takes m = 1', () => {
    const curve: [number, number][] = [
      [0, 0],
      [100, 1800],
      [400, 0],
    ];
    const { growth, load } = estimateRoom(dock({ entries: [{ curve }], options: { combustion_factor: null } }));
    expect(growth.fuelPlateau?.value).toBe(1800);
    expect(load.combustionFactor.value).toBe(1);
  });
  it('a store without a rate per area and without peaks: the fuel plateau is missing, the openings set the curve', () => {
    const store = dock({ room: { use: 'storage' }, entries: [{ peak_kW: null }], options: { plateau_kW_m2: null } });
    expect(whyMissing(store, 'growth.fuelPlateau')).toMatch(/rate per area/);
    expect(codes(estimateRoom(store).growth.plateau)).toContain('FUEL_PLATEAU_UNKNOWN');
  });
});

describe('burn-out', () => {
  const full = { entries: [{ count: 160 }] };

  it('has a parametric curve from 50 MJ/m² of enclosing area on, from t = 0 to 20 °C', () => {
    const { burnout } = estimateRoom(dock(full));
    expect(burnout.asKept?.loadPerEnclosure?.value).toBeCloseTo(4 * 31.905, 1);
    const parametric = burnout.asKept?.parametric;
    expect(parametric?.controlledBy).toBe('ventilation');
    expect(parametric?.timeOfPeak.value).toBeCloseTo((0.2e-3 * 4 * 31.9048 * 60) / 0.0221315, 1);
    expect(parametric?.curve[0]).toEqual([0, 20]);
    expect(parametric?.curve.at(-1)?.[1]).toBe(20);
  });
  it.each<[string, RoomInput, RegExp]>([
    ['a room higher than 4 m', dock({ ...full, room: { height_m: 4.2 } }), /4\.2 m high/],
    ['a roof vent that is not closed', dock({ ...full, room: { roof_vents_m2: 1 } }), /roof vent/i],
    [
      'plastics',
      dock({ entries: [{ count: 160, parts: [{ material: 'polyethylene', net_heat_MJ_kg: 17, mass_kg: 20 }] }] }),
      /cellulosic/,
    ],
  ])('no curve for %s', (_name, input, why) => {
    expect(whyMissing(input, 'burnout.asKept.parametric')).toMatch(why);
  });
  it('warns near the jump of the curve and gives both sides', () => {
    const { burnout } = estimateRoom(
      dock({ entries: [{ count: 60 }], room: { height_m: 2.4 }, options: { time_limit_min: 25 } }),
    );
    const warning = burnout.asKept?.parametric?.peak.warnings.find(({ code }) => code === 'NEAR_JUMP');
    expect(warning?.text).toMatch(/°C while the fuel controls/);
  });
  it('no equivalent time below 2.5 % of openings to the outside, where the method would read too low', () => {
    const inside = dock({ room: { openings: [{ ...door, state: 'open', leads_to: 'inside' }] } });
    expect(whyMissing(inside, 'burnout.asKept.equivalentTime')).toMatch(/2\.5 %/);
  });
  it('above 25 % of openings it is computed with 25 % and says so', () => {
    const wide = dock({ room: { openings: [{ width_m: 10, height_m: 3, state: 'open', leads_to: 'outside' }] } });
    expect(codes(estimateRoom(wide).burnout.asKept?.equivalentTime)).toContain('OPENINGS_ABOVE_RANGE');
  });
  it('unprotected steel takes 13.7 O; timber is excluded', () => {
    const steel = estimateRoom(dock({ options: { kc: 'unprotected_steel' } })).burnout.asKept?.equivalentTime?.value;
    expect(steel).toBeCloseTo(14.107 * 13.7 * 0.0221315, 1);
    expect(whyMissing(dock({ options: { kc: 'timber' } }), 'burnout.asKept.equivalentTime')).toMatch(/timber/);
  });
  it('unknown linings take the largest k_b, with a warning', () => {
    const { burnout } = estimateRoom(dock({ room: { lining: null } }));
    expect(burnout.asKept?.equivalentTime?.value).toBeCloseTo((14.107 * 0.07) / 0.055, 1);
    expect(codes(burnout.asKept?.equivalentTime)).toContain('LINING_UNKNOWN');
  });
  it('stands over a rating that is shorter than the equivalent time', () => {
    expect(estimateRoom(dock({ room: { rating_min: 14 } })).burnout.asKept?.standing).toBe('over');
    expect(estimateRoom(dock({ room: { rating_min: null } })).burnout.asKept?.standing).toBe('no limit set');
  });
});

describe('limits', () => {
  it('are judged on the unrounded value', () => {
    const bound = 13_400 / 96;
    const limits = [bound, bound - 1e-9, bound / 0.91, bound / 0.89].map((one) => ({
      quantity: 'load_per_floor_MJ_m2' as const,
      bound: one,
    }));
    expect(estimateRoom(dock({ limits })).limits.map(({ standing }) => standing)).toEqual([
      'near',
      'over',
      'near',
      'within',
    ]);
  });
  it('on what cannot be computed are listed as missing and get no standing', () => {
    const tally = estimateRoom(dock({ entries: [], limits: [{ quantity: 'peak_kW', bound: 1000 }] }));
    expect(tally.limits).toEqual([{ quantity: 'peak_kW', bound: 1000, ratio: null, standing: 'no limit set' }]);
    expect(tally.missing.map(({ path }) => path)).toContain('limits[0].value');
  });
});

describe('what nobody said', () => {
  it('is named in the working of the load', () => {
    const input = dock({ entries: [{ keeping: null, enclosure: null, evidence: null }, { evidence: null }] });
    const texts = estimateRoom(input, { workings: true }).load.total.steps?.map(({ text }) => text);
    expect(texts).toContain('By default 1 entry is taken as stored.');
    expect(texts).toContain('By default 1 entry is taken as open.');
    expect(texts).toContain('By default 2 entries are taken as estimated.');
  });
});

describe('how sure the load is', () => {
  it('a weighed load is surer than a guessed one, and the band holds its middle', () => {
    const [weighed, guessed] = (['weighed', 'hearsay'] as const).map(
      (evidence) => estimateRoom(dock({ entries: [{ evidence }] })).load,
    );
    expect(weighed?.standardUncertainty?.value ?? 0).toBeLessThan(guessed?.standardUncertainty?.value ?? 0);
    const { p5, p50, p80, p95 } = guessed?.band ?? {};
    const values = [p5, p50, p80, p95].map((one) => one?.value ?? 0);
    expect([...values].sort((a, b) => a - b)).toEqual(values);
    expect(values[0]).toBeGreaterThan(0);
  });
  it('entries of one material share the error of its heat, others do not', () => {
    const two = (materials: readonly string[]) =>
      estimateRoom(
        dock({
          entries: materials.map((material) => ({
            count: 1,
            evidence: 'weighed' as const,
            parts: [{ material, net_heat_MJ_kg: 17, low_MJ_kg: 12, high_MJ_kg: 22, mass_kg: 1000 }],
          })),
        }),
      ).load.standardUncertainty?.value ?? 0;
    expect(two(['timber', 'timber'])).toBeGreaterThan(1.2 * two(['timber', 'cotton']));
  });
});
