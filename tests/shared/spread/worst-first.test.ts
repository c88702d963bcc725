import { describe, expect, it } from 'vitest';
import { simulateSpread } from '@embertally/shared/spread/simulate-spread';
import type { SpreadEntry } from '@embertally/shared/spread/spread-entry';
import { seededRandom } from '../../support/seeded-random.ts';
import { HALL, spreadCase, spreadEntry } from '../../support/spread-samples.ts';

function worst(entries: readonly SpreadEntry[], room = HALL) {
  return simulateSpread(spreadCase(entries, { first: null, room }))!;
}

const FAR = 60;

describe('the worst first entry', () => {
  it('brings flashover soonest, whatever the peaks', () => {
    const entries = [
      spreadEntry('a', [0, 0], { peak_kW: 5000, growth: { by: 't-squared', alpha_kW_s2: 0.01 } }),
      spreadEntry('b', [FAR, 0], { peak_kW: 1200, growth: { by: 't-squared', alpha_kW_s2: 0.1 } }),
    ];
    expect(worst(entries, { ...HALL, flashover_kW: 1000 }).first).toBe('b');
  });

  it('else has the highest peak, then half of the heat soonest, then the first id', () => {
    const base = { heat_MJ: 300, peak_kW: 1000 };
    const slow = { by: 't-squared', alpha_kW_s2: 0.01 } as const;
    const fast = { by: 't-squared', alpha_kW_s2: 0.05 } as const;
    const a = spreadEntry('a', [0, 0], { ...base, growth: slow });
    expect(worst([a, spreadEntry('b', [FAR, 0], { ...base, peak_kW: 1100, growth: slow })]).first).toBe('b');
    expect(worst([a, spreadEntry('b', [FAR, 0], { ...base, growth: fast })]).first).toBe('b');
    expect(worst([spreadEntry('b', [FAR, 0], { ...base, growth: slow }), a]).first).toBe('a');
  });

  it('tries all of 40, and of more only those that radiate most or flash over soonest alone', () => {
    const crowd = (count: number) =>
      Array.from({ length: count }, (_, k) => spreadEntry(`e${String(k).padStart(3, '0')}`, [k * FAR, 0]));
    expect(worst(crowd(40)).chosen).toEqual({ by: 'worst', tried: 40, of: 40 });
    const result = worst(crowd(60));
    expect(result.chosen).toMatchObject({ by: 'worst', of: 60 });
    expect((result.chosen as { tried: number }).tried).toBeLessThanOrEqual(40);
  });

  it('is found among many by its neighbours', () => {
    const lone = Array.from({ length: 60 }, (_, k) =>
      spreadEntry(`e${String(k).padStart(3, '0')}`, [(k + 2) * FAR, 0]),
    );
    const pair = [spreadEntry('x', [0, 0]), spreadEntry('y', [1.5, 0], { peak_kW: 1900 })];
    expect(['x', 'y']).toContain(worst([...lone, ...pair]).first);
  });

  it.each([1, 2, 3, 4, 5, 6])(
    'is none that another first entry would outdo, though most are given up early (room %i)',
    (seed) => {
      const random = seededRandom(seed);
      const between = (low: number, high: number) => low + (high - low) * random();
      const entries = Array.from({ length: 15 }, (_, index) =>
        spreadEntry(`e${index}`, [between(0, 12), between(0, 12)], {
          heat_MJ: between(50, 900),
          peak_kW: between(100, 2500),
          growth: { by: 't-squared', alpha_kW_s2: between(0.003, 0.19) },
        }),
      );
      const room = { ...HALL, flashover_kW: seed % 2 === 0 ? null : 2600 };
      const found = worst(entries, room);
      for (const { id } of entries) {
        const other = simulateSpread(spreadCase(entries, { first: id, room }))!;
        const sooner = (other.flashover_s ?? Infinity) < (found.flashover_s ?? Infinity) - 1e-6;
        const equal = other.flashover_s === found.flashover_s;
        expect(sooner || (equal && other.peak_kW > found.peak_kW + 1e-6), id).toBe(false);
      }
    },
  );

  it('is sought among fewer where there are very many', () => {
    const count = 1200;
    const crowd = Array.from({ length: count }, (_, k) =>
      spreadEntry(`e${String(k).padStart(4, '0')}`, [k * FAR, 0], { heat_MJ: 20 }),
    );
    const { chosen } = worst(crowd);
    expect(chosen).toMatchObject({ by: 'worst', of: count });
    expect((chosen as { tried: number }).tried).toBeLessThanOrEqual(12);
  });
});
