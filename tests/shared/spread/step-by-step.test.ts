import { describe, expect, it } from 'vitest';
import { ignitionOf, type IgnitionClass } from '@embertally/shared/spread/ignition-class';
import { simulateSpread, type SpreadInput } from '@embertally/shared/spread/simulate-spread';
import type { SpreadRoom } from '@embertally/shared/spread/spread-room';
import { seededRandom } from '../../support/seeded-random.ts';
import { HALL, spreadCase, spreadEntry } from '../../support/spread-samples.ts';
import { stepByStep } from './step-by-step.ts';

const CLASSES: readonly IgnitionClass[] = ['easy', 'normal', 'hard', 'resistant'];
const LAYER = { conductivity_W_mK: 0.48, density_kg_m3: 1440, specific_heat_J_kgK: 840, thickness_m: 0.016 };

function roomWith(F: number, flashover_kW: number | null): SpreadRoom {
  const liningArea_m2 = 400;
  return {
    ...HALL,
    surfaces: [{ area_m2: liningArea_m2, layers: [LAYER] }],
    liningArea_m2,
    factorBefore: F,
    factorAfter: 1.5 * F,
    flashover_kW,
  };
}

const ROOMS: readonly (readonly [string, SpreadRoom])[] = [
  ['a hall', HALL],
  ['a room with a hot layer and flashover', roomWith(6, 4200)],
  ['a room with a hot layer and no criterion, short of air', roomWith(2.4, null)],
];

function seededCase(room: SpreadRoom, seed: number, count: number): SpreadInput {
  const random = seededRandom(seed);
  const between = (low: number, high: number) => low + (high - low) * random();
  return spreadCase(
    Array.from({ length: count }, (_, index) =>
      spreadEntry(`e${index}`, [between(0, 9), between(0, 9)], {
        size: [between(0.3, 3), between(0.3, 1)],
        place: { rotation_deg: between(0, 180), base_m: random() < 0.15 ? 1.4 : 0 },
        heat_MJ: between(20, 900),
        peak_kW: between(80, 2500),
        growth:
          random() < 0.1
            ? { by: 'step' }
            : { by: 't-squared', alpha_kW_s2: 1000 / [600, 300, 150, 75][index % 4]! ** 2 },
        ignition: ignitionOf(CLASSES[Math.floor(between(0, 4))]!),
        enclosure: random() < 0.1 ? 'cabinet' : 'open',
      }),
    ),
    { room },
  );
}

function compare(input: SpreadInput): number {
  const plain = stepByStep(input);
  const fast = simulateSpread(input)!;
  const expected = new Map(plain.events.map((event) => [event.id, event]));
  expect(new Set(fast.events.map(({ id }) => id))).toEqual(new Set(expected.keys()));
  for (const { id, t, cause } of fast.events) {
    const other = expected.get(id!)!;
    expect(Math.abs(t - other.t), `${id} at ${t} against ${other.t}`).toBeLessThan(1);
    expect(cause, id!).toBe(other.cause);
  }
  expect(fast.flashover_s === null).toBe(plain.flashover === null);
  expect(Math.abs(fast.released_MJ / plain.released_MJ - 1)).toBeLessThan(0.002);
  return fast.events.length;
}

describe('the fast solution against plain steps of one second', () => {
  describe.each(ROOMS)('%s', (_name, room) => {
    it.each([1, 2, 3, 4, 5, 6])('seed %i', (seed) => {
      compare(seededCase(room, seed, 24));
    });

    it('has spread to compare', () => {
      const lit = [1, 2, 3, 4, 5, 6].map((seed) => simulateSpread(seededCase(room, seed, 24))!.events.length);
      expect(Math.max(...lit)).toBeGreaterThan(8);
    });
  });
});
