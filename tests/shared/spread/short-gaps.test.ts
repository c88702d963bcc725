import { describe, expect, it } from 'vitest';
import { ignitionOf, type IgnitionClass } from '@embertally/shared/spread/ignition-class';
import { shortGaps } from '@embertally/shared/spread/short-gaps';
import { spreadGaps } from '@embertally/shared/spread/spread-gaps';
import { seededRandom } from '../../support/seeded-random.ts';
import { HALL, spreadEntry } from '../../support/spread-samples.ts';

const CLASSES: readonly IgnitionClass[] = ['easy', 'normal', 'hard', 'resistant'];

function strewn(seed: number) {
  const random = seededRandom(seed);
  const between = (low: number, high: number) => low + (high - low) * random();
  return Array.from({ length: 25 }, (_, index) =>
    spreadEntry(`e${String(index).padStart(2, '0')}`, [between(0, 16), between(0, 16)], {
      size: [between(0.2, 6), between(0.2, 1)],
      place: { rotation_deg: between(0, 180) },
      peak_kW: between(20, 3000),
      ignition: ignitionOf(CLASSES[index % 4]!),
    }),
  );
}

describe('pairs that stand too near', () => {
  it.each([1, 2, 3, 4, 5, 6, 7, 8])('are those of all pairs whose gap is smaller than enough (room %i)', (seed) => {
    const layers = [{ thickness_m: 0.02, conductivity_W_mK: 0.5, density_kg_m3: 1000, specific_heat_J_kgK: 900 }];
    const layered = { ...HALL, factorBefore: 3, liningArea_m2: 400, surfaces: [{ area_m2: 400, layers }] };
    const room = [HALL, layered, { ...HALL, flashover_kW: 1800 }][seed % 3]!;
    const input = { room, entries: strewn(seed), ignition: 'dose' } as const;
    const all = spreadGaps(input);
    const short = all.filter(({ gap_m, enough }) => enough.metres === null || gap_m < enough.metres);
    const found = shortGaps(input, Infinity);
    expect(found.pairs).toBe(all.length);
    expect(found.short).toBe(short.length);
    const named = (gaps: typeof all) => new Map(gaps.map((gap) => [`${gap.from} ${gap.to}`, gap]));
    const expected = named(short);
    expect(new Set(named(found.gaps).keys())).toEqual(new Set(expected.keys()));
    for (const [name, gap] of named(found.gaps)) {
      const same = expected.get(name)!;
      for (const answer of ['justNot', 'enough', 'longExposureJustNot', 'longExposureEnough'] as const) {
        expect(gap[answer].never).toBe(same[answer].never);
        expect(gap[answer].metres ?? 0).toBeCloseTo(same[answer].metres ?? 0, 2);
      }
    }
  });

  it('begin with the one that lacks most, and end with those that no gap would help', () => {
    const { gaps } = shortGaps(
      { room: { ...HALL, flashover_kW: 1800 }, entries: strewn(3), ignition: 'dose' },
      Infinity,
    );
    const lacks = gaps.map(({ gap_m, enough }) => (enough.metres === null ? -1 : enough.metres - gap_m));
    expect(lacks.length).toBeGreaterThan(2);
    expect(lacks).toEqual([...lacks].sort((a, b) => b - a));
  });

  it('are all counted while only some are written out', () => {
    const input = { room: HALL, entries: strewn(1), ignition: 'dose' } as const;
    const { short, gaps } = shortGaps(input, 3);
    expect(gaps).toHaveLength(3);
    expect(short).toBeGreaterThan(3);
    expect(gaps).toEqual(shortGaps(input, Infinity).gaps.slice(0, 3));
  });
});
