import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Estimate } from '@embertally/shared/methods/estimate';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { expectFinite } from './expect-finite.ts';
import { SCENERY_DOCK } from './scenery-dock.ts';

type Entry = RoomInput['contents'][number];
type Options = NonNullable<RoomInput['options']>;
const [flats] = SCENERY_DOCK.contents as [Entry];
const SAMPLES = 20_000;

function dock(
  entries: readonly Partial<Entry>[],
  options: Options = {},
  room: Partial<RoomInput['room']> = {},
): RoomInput {
  return {
    ...SCENERY_DOCK,
    room: { ...SCENERY_DOCK.room, ...room },
    contents: entries.map((entry, i) => ({ ...flats, id: `e${i}`, label: `Entry ${i}`, ...entry })),
    options: { ...SCENERY_DOCK.options, samples: SAMPLES, seed: 1, ...options },
  };
}

/** Parts of one kilogram-heat without any spread of their own. */
const exact = (mass_kg: number, material = 'timber') => ({
  material,
  net_heat_MJ_kg: 17,
  low_MJ_kg: 17,
  high_MJ_kg: 17,
  mass_kg,
});
const tallyOf = (input: RoomInput, workings = false): RoomTally => estimateRoom(input, { spread: false, workings });
function certainOf(input: RoomInput) {
  const { uncertainty } = tallyOf(input);
  if (uncertainty === undefined) throw new Error('The tally has no uncertainty.');
  return uncertainty;
}
const valueOf = (estimate: Estimate | undefined): number => estimate?.value ?? Number.NaN;

describe('a tally with samples', () => {
  it('has its band from them, and without them to first order', () => {
    const sampled = tallyOf(dock([{}]));
    expect(sampled.load.band?.p95.method).toBe('uncertainty.monte-carlo@1');
    expect(sampled.load.band?.p95).toEqual(sampled.uncertainty?.bands.perFloor?.p95);
    const plain = tallyOf(dock([{}], { samples: 0 }));
    expect(plain.load.band?.p95.method).toBe('uncertainty.band@1');
    expect(plain.uncertainty).toBeUndefined();
    expect(sampled.load.standardUncertainty).toEqual(plain.load.standardUncertainty);
  });

  it('has the fractiles a lognormal mass, a triangle of things overlooked and a floor give', () => {
    // One entry of exact heat: 100 kg × 17 MJ/kg on 96 m², mass 30 % lognormal. Four million numpy samples of
    // lognormal(1, 0.3) · (1 + triangular(0, 0.05, 0.15)) / normal(1, 0.01) · 17.7083 give these.
    const { perFloor } = certainOf(
      dock([{ count: 1, evidence: 'estimated', parts: [exact(100)] }], { samples: 100_000 }),
    ).bands;
    expect(valueOf(perFloor?.p5) / 11.125).toBeCloseTo(1, 2);
    expect(valueOf(perFloor?.p50) / 18.082).toBeCloseTo(1, 2);
    expect(valueOf(perFloor?.p80) / 23.181).toBeCloseTo(1, 2);
    expect(valueOf(perFloor?.p95) / 29.375).toBeCloseTo(1, 2);
    expect(valueOf(perFloor?.mean) / (17.7083 * (1 + 0.2 / 3))).toBeCloseTo(1, 2);
  });

  it('agrees with the first-order band where the spreads are small', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 1, max: 500, noNaN: true }), { minLength: 1, maxLength: 5 }), (masses) => {
        const entries = masses.map((mass) => ({ count: 1, evidence: 'weighed' as const, parts: [exact(mass)] }));
        const [first, sampled] = [0, SAMPLES].map((samples) => tallyOf(dock(entries, { samples })).load.band);
        for (const p of ['p5', 'p50', 'p80', 'p95'] as const) {
          expect(valueOf(sampled?.[p]) / valueOf(first?.[p])).toBeCloseTo(1, 1.8);
        }
      }),
      { numRuns: 8 },
    );
  });

  it('has bands in order that contain their mean and nothing that is not finite', () => {
    const evidence = fc.constantFrom('weighed', 'counted', 'measured', 'estimated', 'hearsay');
    const entry = fc.record({
      count: fc.integer({ min: 0, max: 30 }),
      evidence,
      enclosure: fc.constantFrom('open', 'cabinet', 'sealed'),
      keeping: fc.constantFrom('fixed', 'stored', 'passing'),
      parts: fc.array(
        fc.record({
          material: fc.constantFrom('timber', 'cotton', 'petrol'),
          mass_kg: fc.double({ min: 0, max: 900, noNaN: true }),
          moisture_pct: fc.option(fc.double({ min: 0, max: 60, noNaN: true })),
        }),
        { maxLength: 3 },
      ),
    });
    fc.assert(
      fc.property(
        fc.array(entry, { maxLength: 6 }),
        fc.constantFrom('as_surveyed', 'mean', 'peak_stock'),
        fc.constantFrom('EN', '0.85'),
        fc.nat(),
        (entries, load_basis, protected_loads, seed) => {
          const tally = tallyOf(dock(entries, { samples: 1500, seed, load_basis, protected_loads }), true);
          expectFinite(tally.uncertainty);
          for (const band of Object.values(tally.uncertainty?.bands ?? {})) {
            const [p5, p50, p80, p95, mean] = [band.p5, band.p50, band.p80, band.p95, band.mean].map(valueOf);
            expect(p5).toBeLessThanOrEqual(p50!);
            expect(p50).toBeLessThanOrEqual(p80!);
            expect(p80).toBeLessThanOrEqual(p95!);
            expect(mean! * (1 + 1e-12)).toBeGreaterThanOrEqual(p5!);
            expect(mean! * (1 - 1e-12)).toBeLessThanOrEqual(p95!);
          }
          const shares = tally.uncertainty?.shares.map(({ share }) => valueOf(share)) ?? [];
          const sum = shares.reduce((total, share) => total + share, 0);
          if (shares.length > 0) expect(sum).toBeCloseTo(100, 6);
        },
      ),
      { numRuns: 40 },
    );
  });

  it('tells the peak with the plateau that governs and the equivalent time with its load', () => {
    // All peaks known and small: the plateau is their sum, 2500 kW, lognormal 25 %.
    const { peak } = certainOf(dock([{}], { samples: 100_000 })).bands;
    expect(valueOf(peak?.mean) / 2500).toBeCloseTo(1, 2);
    // exp(σ z) of lognormal(1, 0.25): 0.6471 and 1.4545 by hand.
    expect(valueOf(peak?.p5) / 2500).toBeCloseTo(0.6471, 2);
    expect(valueOf(peak?.p95) / 2500).toBeCloseTo(1.4545, 2);
    const tally = tallyOf(dock([{ evidence: 'weighed', parts: [exact(20)] }]));
    const time = tally.uncertainty?.bands.equivalentTime;
    // Openings, height and floor leave it near the computed one, moved by what is overlooked: + 6.7 %.
    expect(valueOf(time?.p50) / valueOf(tally.burnout.asKept?.equivalentTime)).toBeCloseTo(1.0667, 1);
    expect(valueOf(time?.p95) / valueOf(time?.p50)).toBeLessThan(1.15);
  });

  it('follows the openings where unprotected steel is asked about', () => {
    const widthOf = (kc: Options['kc']) => {
      const time = certainOf(dock([{ evidence: 'weighed', parts: [exact(20)] }], { kc })).bands.equivalentTime;
      return valueOf(time?.p95) / valueOf(time?.p5);
    };
    expect(widthOf('unprotected_steel')).not.toBeCloseTo(widthOf(1), 3);
  });

  it('says what is missing instead of a band', () => {
    const closed = tallyOf(dock([{}], {}, { openings: [] }));
    expect(closed.uncertainty?.bands.equivalentTime).toBeUndefined();
    expect(closed.missing.map(({ path }) => path)).toContain('uncertainty.bands.equivalentTime');
    const empty = tallyOf(dock([]));
    expect(empty.uncertainty?.bands.perFloor?.p95.value).toBe(0);
    expect(empty.uncertainty?.shares).toEqual([]);
    expect(empty.uncertainty?.advice).toEqual([]);
  });

  it('gives the same numbers for the same seed, and tells how far it is', () => {
    const told: number[] = [];
    const input = dock([{}, { evidence: 'hearsay' }]);
    const once = estimateRoom(input, { spread: false, onSampled: (share) => told.push(share) });
    expect(estimateRoom(input, { spread: false })).toEqual(once);
    expect(told.at(-1)).toBe(1);
    expect(told.length).toBeGreaterThan(10);
  });

  it('opens a working that names samples, seed and the spreads', () => {
    const p95 = tallyOf(dock([{}]), true).load.band?.p95;
    expect(p95?.inputs?.map(({ name, value }) => [name, value])).toEqual(
      expect.arrayContaining([
        ['N', SAMPLES],
        ['seed', 1],
      ]),
    );
    expect(p95?.assumptions?.join(' ')).toMatch(/lognormal.*triangular/s);
    expect(p95?.steps?.at(-1)).toMatchObject({ value: p95?.value, unit: 'MJ/m2' });
  });
});

describe('what matters most', () => {
  it('is the guessed entry beside a weighed one of the same heat', () => {
    const { shares } = certainOf(
      dock([
        { count: 1, evidence: 'weighed', parts: [exact(500)] },
        { count: 1, evidence: 'hearsay', parts: [exact(500, 'cotton')] },
      ]),
    );
    expect(shares[0]).toMatchObject({ key: 'mass:e1', kind: 'mass', entryIds: ['e1'], label: 'Mass of Entry 1' });
    expect(valueOf(shares[0]?.share)).toBeGreaterThan(90);
  });

  it('is the heat of a material that is in every entry, all weighed', () => {
    const parts = [{ material: 'timber', net_heat_MJ_kg: 17, low_MJ_kg: 8, high_MJ_kg: 26, mass_kg: 100 }];
    const { shares } = certainOf(dock(Array.from({ length: 6 }, () => ({ evidence: 'weighed' as const, parts }))));
    expect(shares[0]).toMatchObject({ key: 'heat:timber', kind: 'heat' });
    expect(shares[0]?.entryIds).toHaveLength(6);
  });

  it('is the cabinet where everything stands in one', () => {
    const { shares } = certainOf(dock([{ evidence: 'weighed', enclosure: 'cabinet', parts: [exact(100)] }]));
    expect(shares[0]).toMatchObject({ key: 'enclosure:e0', kind: 'enclosure' });
    const ruled = certainOf(
      dock([{ evidence: 'weighed', enclosure: 'cabinet', parts: [exact(100)] }], { protected_loads: 'EN' }),
    );
    expect(ruled.shares.map(({ kind }) => kind)).not.toContain('enclosure');
  });
});

describe('advice', () => {
  const guessed = (mass: number) => ({ count: 1, evidence: 'estimated' as const, parts: [exact(mass)] });

  it('names the fewest entries that halve the band, and by how much', () => {
    const { advice } = certainOf(dock([guessed(1000), guessed(900), guessed(20), guessed(10)]));
    expect(advice[0]).toMatchObject({ kind: 'weigh', entryIds: ['e0', 'e1'] });
    expect(advice[0]?.text).toMatch(
      /^Weigh these two entries: “Entry 0” and “Entry 1”. The band would be \d+ % narrower\.$/,
    );
    expect(advice[0]?.narrowing).toBeGreaterThan(0.5);
  });

  it('keeps its promise when it is followed', () => {
    const before = dock([guessed(1000), guessed(900), guessed(800)], { samples: 0 });
    const { advice } = certainOf({ ...before, options: { ...before.options, samples: 500 } });
    const [first] = advice;
    const after = {
      ...before,
      contents: before.contents.map((entry) =>
        first?.entryIds.includes(entry.id) === true ? { ...entry, evidence: 'weighed' as const } : entry,
      ),
    };
    const [old, now] = [before, after].map((input) => tallyOf(input).load.band);
    const widthOf = (band: typeof old) => valueOf(band?.p95) - valueOf(band?.p5);
    expect(first?.narrowing).toBeCloseTo(1 - widthOf(now) / widthOf(old), 9);
    expect(first?.p95.value).toBeCloseTo(valueOf(now?.p95), 9);
  });

  it('is to measure a heat where that is what matters', () => {
    const parts = [{ material: 'timber', net_heat_MJ_kg: 17, low_MJ_kg: 8, high_MJ_kg: 26, mass_kg: 100 }];
    const { advice } = certainOf(dock(Array.from({ length: 6 }, () => ({ evidence: 'weighed' as const, parts }))));
    expect(advice.map(({ kind }) => kind)).toEqual(['heat']);
    expect(advice[0]?.text).toMatch(/^Have the heat of “.+” measured\./);
  });

  it('is none where nothing narrows the band by a tenth', () => {
    const { advice } = certainOf(dock([{ evidence: 'weighed', parts: [exact(100)] }]));
    expect(advice).toEqual([]);
  });
});
