import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { estimateSpread } from '@embertally/shared/tally/estimate-spread';
import { parseRoomInput } from '@embertally/shared/tally/parse-room-input';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import type { SpreadTally } from '@embertally/shared/tally/room-tally';
import { expectFinite } from './expect-finite.ts';

const PLASTER = {
  layers: [{ thickness_m: 0.016, conductivity_W_mK: 0.48, density_kg_m3: 1440, specific_heat_J_kgK: 840 }],
};
const ROOM = {
  name: 'Property store',
  ring_m: [
    [0, 0],
    [5, 0],
    [5, 4],
    [0, 4],
  ],
  height_m: 2.7,
  lining: { walls: PLASTER, ceiling: PLASTER, floor: PLASTER },
  openings: [{ width_m: 0.9, height_m: 2, state: 'open', leads_to: 'outside' }],
};
/** Open to the sky on all sides for the fire: no layer, no flashover, more air than is asked for. */
const HALL = {
  name: 'Hall',
  ring_m: [
    [-20, -20],
    [20, -20],
    [20, 20],
    [-20, 20],
  ],
  height_m: 8,
  openings: [{ width_m: 10, height_m: 4, state: 'open', leads_to: 'outside' }],
};

type Spec = {
  readonly id: string;
  readonly at?: readonly [number, number];
  readonly size?: readonly [number, number];
  readonly MJ: number;
  readonly kW: number;
  readonly growth: string;
  readonly lights: string;
  readonly more?: object;
};

function entry({ id, at, size = [1, 1], MJ, kW, growth, lights, more }: Spec) {
  return {
    id,
    label: `Entry ${id}`,
    count: 1,
    parts: [{ net_heat_MJ_kg: 10, mass_kg: MJ / 10, heat_basis: 'effective' }],
    ...(at && { x_m: at[0], y_m: at[1] }),
    width_m: size[0],
    depth_m: size[1],
    height_m: 1,
    growth,
    peak_kW: kW,
    radiative_fraction: 0.35,
    ignition_class: lights,
    ...more,
  };
}

function parsed(room: object, contents: readonly object[], options: object = {}): RoomInput {
  const result = parseRoomInput({ room, contents, options });
  if (!result.ok) throw new Error(JSON.stringify(result.errors));
  return result.value;
}

const A: Spec = { id: 'A', at: [0, 0], size: [1.4, 1.4], MJ: 800, kW: 2500, growth: 'fast', lights: 'normal' };
const B: Spec = { id: 'B', at: [2.5, 0], MJ: 300, kW: 1500, growth: 'fast', lights: 'normal' };
const CHAIN = [
  { id: 'A', at: [0.6, 0.6], size: [0.9, 0.9], MJ: 300, kW: 1500, growth: 'fast', lights: 'normal' },
  { id: 'B', at: [2.6, 0.6], size: [2, 0.9], MJ: 800, kW: 2500, growth: 'fast', lights: 'normal' },
  { id: 'C', at: [4.7, 3], size: [0.4, 1.8], MJ: 1500, kW: 1200, growth: 'medium', lights: 'hard' },
] as const satisfies readonly Spec[];

function timeOf(spread: SpreadTally | undefined, id: string): number | undefined {
  return spread?.events?.find((event) => event.id === id)?.t.value ?? undefined;
}

function area(curve: SpreadTally['curve'] = []): number {
  return curve.slice(1).reduce((sum, [t, q], i) => sum + ((t - curve[i]![0]) * (q + curve[i]![1])) / 2000, 0);
}

describe('published cases, from the input of an estimate to its section of spread', () => {
  it('S2: the second entry lights at 328.66 s; S10: its gap is 1.3 m of 2.277 m that would be enough', () => {
    const { spread } = estimateRoom(parsed(HALL, [entry(A), entry(B)], { first_entry: 'A' }));
    expect(timeOf(spread, 'B')).toBeCloseTo(328.66, 0);
    expect(spread?.heatReleased?.value).toBeCloseTo(1100, 0);
    expect(spread?.unburnt?.value).toBeCloseTo(0, 6);
    expect(spread?.flashover).toMatchObject({ value: null, unit: 's' });
    const gap = spread?.gaps?.find(({ from }) => from === 'A');
    expect(gap?.gap_m.value).toBeCloseTo(1.3, 3);
    expect(gap?.just_not_m.value).toBeCloseTo(1.405, 2);
    expect(gap?.enough_m.value).toBeCloseTo(2.277, 2);
    expect(gap?.long_exposure_m.value).toBeCloseTo(3.032, 2);
    expect(spread?.pairs).toBe(2);
  });

  it('S3: half a metre farther away it never lights', () => {
    const { spread } = estimateRoom(parsed(HALL, [entry(A), entry({ ...B, at: [3.5, 0] })], { first_entry: 'A' }));
    expect(spread?.events?.map(({ id, cause }) => [id, cause])).toEqual([['A', 'first']]);
    expect(spread?.unburnt?.value).toBeCloseTo(300, 6);
  });

  it('S6: the worst first entry is found, the chain goes to flashover, the sealed one stays out', () => {
    const sealed = entry({ ...CHAIN[0], id: 'D', at: [2.6, 3], more: { enclosure: 'sealed', sealed_rating_min: 90 } });
    const cabinet = entry({
      id: 'E',
      at: [0.6, 3],
      size: [0.9, 0.9],
      MJ: 600 / 0.85,
      kW: 900,
      growth: 'medium',
      lights: 'normal',
      more: { enclosure: 'cabinet' },
    });
    const { spread, room } = estimateRoom(parsed(ROOM, [...CHAIN.map(entry), sealed, cabinet]));
    expect(spread?.first).toBe('A');
    expect(spread?.firstChosen).toBe('worst');
    expect(timeOf(spread, 'B')).toBeCloseTo(140.57, 0);
    expect(Math.abs((spread?.flashover?.value ?? 0) - 183.1)).toBeLessThan(1);
    expect(spread?.events?.filter(({ cause }) => cause === 'flashover').map(({ id }) => id)).toEqual(['C', 'E']);
    expect(timeOf(spread, 'D')).toBeUndefined();
    expect(spread?.peak?.value).toBeCloseTo(room.ventilationLimit?.value ?? 0, 6);
    expect(spread?.heatReleased?.value).toBeCloseTo(3200, 0);
    expect(spread?.layerIncluded).toBe(true);
  });
});

describe('what is missing', () => {
  const why = (input: RoomInput) => estimateRoom(input).missing.find(({ path }) => path === 'spread.events');

  it.each<[string, RoomInput, string, RegExp]>([
    ['nothing burns', parsed(ROOM, []), 'contents', /nothing that burns/i],
    ['no place', parsed(ROOM, [entry({ ...A, at: undefined })]), 'contents.x_m', /place on the plan/],
    [
      'a sealed first entry',
      parsed(ROOM, [entry(A), entry({ ...B, more: { enclosure: 'sealed', sealed_rating_min: 60 } })], {
        first_entry: 'B',
      }),
      'options.first_entry',
      /sealed/,
    ],
    [
      'too many',
      parsed(
        ROOM,
        Array.from({ length: 2001 }, (_, i) => entry({ ...B, id: `e${i}` })),
      ),
      'contents',
      /2001 entries.*2000/,
    ],
  ])('%s: says which input is lacking', (_name, input, wanted, text) => {
    expect(why(input)).toMatchObject({ section: 'spread', input: wanted });
    expect(why(input)?.why).toMatch(text);
  });

  it('an unknown first entry is a fault of the input', () => {
    const result = parseRoomInput({ room: ROOM, contents: [entry(A)], options: { first_entry: 'Z' } });
    expect(result).toMatchObject({ ok: false, errors: [{ pointer: '/options/first_entry', code: 'unknown_entry' }] });
  });

  it('an unknown first entry that comes from a document does not throw', () => {
    const input = parsed(ROOM, [entry(A)]);
    expect(why({ ...input, options: { first_entry: 'Z' } })?.input).toBe('options.first_entry');
  });

  it('spread is left out, and listed nowhere, where it was not asked for', () => {
    const tally = estimateRoom(parsed(ROOM, [entry(A)]), { spread: false });
    expect(tally.spread).toBeUndefined();
    expect(tally.missing.some(({ section }) => section === 'spread')).toBe(false);
    expect(tally.cautions).not.toContain('order-and-gaps');
    expect(estimateRoom(parsed(ROOM, [entry(A)])).cautions).toContain('order-and-gaps');
  });
});

describe('the section on its own', () => {
  it('is the same as in the whole tally', () => {
    const input = parsed(ROOM, CHAIN.map(entry));
    const whole = estimateRoom(input, { workings: true });
    const alone = estimateSpread(input, { workings: true });
    expect(alone.spread).toEqual(whole.spread);
    expect(alone.missing).toEqual(whole.missing.filter(({ section }) => section === 'spread'));
  });

  it('tells in its working who burns first by name, and what the model leaves out', () => {
    const { spread } = estimateSpread(parsed(ROOM, CHAIN.map(entry)), { workings: true });
    expect(spread.peak?.steps?.map(({ text }) => text)).toContain('First to burn: Entry A, the worst of 3 tried of 3.');
    expect(spread.peak?.assumptions).toContain('No shading, no draught.');
    expect(spread.events?.[1]?.t.steps?.map(({ text }) => text).join(' ')).toContain('most of it from Entry A');
  });

  it('says when the air of a closed room ends it', () => {
    const closed = { ...ROOM, openings: [] };
    const { spread, air } = estimateRoom(parsed(closed, CHAIN.map(entry), { first_entry: 'A' }));
    expect(spread?.events?.at(-1)).toMatchObject({ id: null, cause: 'starved' });
    expect(spread?.heatReleased?.value).toBeCloseTo(air.oxygenLimitedHeat?.value ?? 0, 6);
    expect(spread?.peak?.warnings.map(({ code }) => code)).toContain('NO_OPENING');
  });
});

describe('a fire that is cut short while it grows', () => {
  it.each([
    ['starved early, peak given', 2, { mass_kg: 14_178, net_heat_MJ_kg: 0.000_696_312 }, { peak_kW: 145.124_7 }],
    [
      'starved early, peak from the footprint',
      0.4,
      { mass_kg: 2784, net_heat_MJ_kg: 0.000_553_645 },
      { width_m: 0.4727 },
    ],
    ['starved at once', 0.4, { mass_kg: 1e5, net_heat_MJ_kg: 100 }, { peak_kW: 1e6, growth: 'slow' }],
  ])('%s: the curve still holds what is released', (_name, height_m, part, more) => {
    const [w, d] = [0.5, 0.5];
    const ring_m = [
      [0, 0],
      [w, 0],
      [w, d],
      [0, d],
    ];
    const one = { id: 'a', count: 1, parts: [part], x_m: 0, y_m: 0, depth_m: 0.178, ...more };
    const { spread } = estimateRoom(parsed({ name: 'Closet', ring_m, height_m }, [one]));
    expect(spread?.events?.at(-1)?.cause).toBe('starved');
    expect(Math.abs(area(spread?.curve) / (spread?.heatReleased?.value ?? NaN) - 1)).toBeLessThan(1e-3);
  });
});

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const contents = fc.array(
  fc.record({
    count: fc.constantFrom(1, 3),
    parts: fc.array(
      fc.record({
        net_heat_MJ_kg: fc.oneof(fc.constant(0), number(1e-9, 150)),
        mass_kg: fc.oneof(fc.constant(0), number(1e-9, 1e5)),
      }),
      { maxLength: 2 },
    ),
    enclosure: fc.constantFrom('open' as const, 'cabinet' as const, 'sealed' as const),
    sealed_rating_min: fc.constantFrom(null, 60),
    growth: fc.constantFrom(null, 'slow' as const, 'ultra-fast' as const),
    peak_kW: fc.option(fc.oneof(number(1e-9, 1), number(1, 1e6)), { nil: null }),
    x_m: fc.option(fc.oneof(number(0, 6), number(-10_000, 10_000)), { nil: null, freq: 5 }),
    y_m: number(0, 6),
    base_height_m: fc.constantFrom(0, 1, 100),
    width_m: fc.option(fc.oneof(number(0.05, 5), number(1e-9, 1000)), { nil: null, freq: 5 }),
    depth_m: number(0.05, 5),
    rotation_deg: fc.constantFrom(0, 90, 17),
    radiative_fraction: fc.constantFrom(null, 0, 1),
    ignites_at_kW_m2: fc.constantFrom(null, 1e-6, 200),
    curve: fc.constantFrom(null, null, null, [
      [0, 0],
      [60, 900],
      [400, 0],
    ] as [number, number][]),
  }),
  { maxLength: 6 },
);
const anyRoom = fc
  .record({
    width: fc.oneof(number(0.5, 12), number(1e-3, 10_000)),
    height_m: fc.oneof(number(2, 5), number(1e-6, 100)),
    lined: fc.boolean(),
    openings: fc.array(
      fc.record({
        width_m: number(1e-9, 6),
        height_m: number(1e-9, 2),
        state: fc.constantFrom('open', 'fails', 'closed'),
      }),
      { maxLength: 3 },
    ),
    contents,
    ambient_C: fc.constantFrom(null, -50, 60),
  })
  .map(({ width, height_m, lined, openings, contents: entries, ambient_C }) =>
    parseRoomInput({
      room: {
        name: 'Any',
        ring_m: [
          [0, 0],
          [width, 0],
          [width, width],
          [0, width],
        ],
        height_m,
        lining: lined ? { walls: PLASTER, ceiling: PLASTER, floor: PLASTER } : null,
        openings: openings.filter((one) => one.height_m <= height_m),
        protection: { sprinklers: { rti: 50, activation_C: 68 }, detection: 'both' },
      },
      contents: entries.map((one, index) => ({ id: `e${index}`, ...one })),
      options: { ambient_C },
    }),
  );

describe('any room that the input allows', () => {
  it('gives finite numbers and keeps its heat: released and unburnt make the whole, the curve holds what is released', () => {
    fc.assert(
      fc.property(anyRoom, (result) => {
        if (!result.ok) return;
        const tally = estimateRoom(result.value);
        expectFinite(tally);
        const { spread, growth } = tally;
        if (!spread?.heatReleased || !spread.unburnt) return;
        const released = spread.heatReleased.value ?? NaN;
        const whole = growth.heatReleased?.value ?? NaN;
        expect(Math.abs((released + (spread.unburnt.value ?? NaN)) / whole - 1)).toBeLessThan(1e-3);
        expect(Math.abs(area(spread.curve) / released - 1)).toBeLessThan(1e-3);
      }),
      { numRuns: 150 },
    );
  }, 60_000);
});
