import { describe, expect, it } from 'vitest';
import { simulateSpread } from '@embertally/shared/spread/simulate-spread';
import type { SpreadEntry } from '@embertally/shared/spread/spread-entry';
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
});
