import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { designFire, designFireCurve } from '@embertally/shared/methods/growth/design-fire';
import { detectorResponse } from '@embertally/shared/methods/plume/detector-response';
import { smokeIndicator } from '@embertally/shared/methods/plume/smoke-indicator';
import { squareFire } from '../../reference/square-fire.ts';

interface Case {
  readonly t: readonly number[];
  readonly Q: readonly number[];
  readonly H: number;
  readonly r: number;
  readonly RTI: number;
}

const ROOM = { place: 'free', T_a: 20, T_act: 68 } as const;
const run = (given: Case) => detectorResponse.run({ ...ROOM, ...given });

/** The same equation by fourth-order Runge-Kutta steps of 0.02 s, written apart. */
function bySmallSteps({ t, Q, H, r, RTI }: Case): number | null {
  const step = 0.02;
  let piece = 1;
  const rate = (time: number): number => {
    while (piece < t.length - 1 && time > t[piece]!) piece += 1;
    while (piece > 1 && time < t[piece - 1]!) piece -= 1;
    const share = (time - t[piece - 1]!) / (t[piece]! - t[piece - 1]!);
    return Q[piece - 1]! + share * (Q[piece]! - Q[piece - 1]!);
  };
  const slope = (time: number, rise: number): number => {
    const q = rate(time);
    const gas = r / H <= 0.18 ? (16.9 * q ** (2 / 3)) / H ** (5 / 3) : (5.38 * (q / r) ** (2 / 3)) / H;
    const u = r / H <= 0.15 ? 0.96 * (q / H) ** (1 / 3) : (0.195 * q ** (1 / 3) * H ** 0.5) / r ** (5 / 6);
    return (Math.sqrt(u) * (gas - rise)) / RTI;
  };
  let rise = 0;
  for (let time = t[0]!; time < t[t.length - 1]!; time += step) {
    const a = slope(time, rise);
    const b = slope(time + step / 2, rise + (a * step) / 2);
    const c = slope(time + step / 2, rise + (b * step) / 2);
    const d = slope(time + step, rise + c * step);
    rise += ((a + 2 * b + 2 * c + d) * step) / 6;
    if (rise >= 48) return time + step;
  }
  return null;
}

function decaying(E: number, Q_max: number, alpha: number): Pick<Case, 't' | 'Q'> {
  const curve = designFireCurve(designFire.run({ E, Q_max, alpha }));
  return { t: curve.map(([time]) => time), Q: curve.map(([, rate]) => rate) };
}

describe('response of a detector to any curve', () => {
  it.each([
    ['a design fire', { ...decaying(10_720, 2500, 0.0111111), H: 4, r: 3, RTI: 100 }],
    ['a slow device', { ...decaying(10_720, 2500, 0.0111111), H: 4, r: 3, RTI: 350 }],
    ['a high hall that never lets it respond', { ...decaying(10_720, 2500, 0.0111111), H: 12, r: 3, RTI: 50 }],
    ['a fire that dies too soon', { ...decaying(60, 1200, 0.0444444), H: 4, r: 3, RTI: 350 }],
    ['a fire right below', { ...decaying(500, 1500, 0.177778), H: 5, r: 0.2, RTI: 80 }],
    ['a curve of few points', { t: [0, 120, 130, 400, 900], Q: [0, 200, 1800, 600, 2500], H: 5, r: 4, RTI: 135 }],
  ] as const)('agrees with small steps: %s', (_name, given) => {
    const expected = bySmallSteps(given);
    const { time } = run(given);
    if (expected === null) expect(time).toBeNull();
    else expect(Math.abs((time ?? Infinity) - expected)).toBeLessThan(0.1);
  });

  it('a slower, farther or higher device never responds sooner', () => {
    const fire = squareFire(0.0444444, 600);
    const at = (H: number, r: number, RTI: number) => run({ ...fire, H, r, RTI }).time ?? Infinity;
    const range = (min: number, max: number) => fc.double({ min, max, noNaN: true });
    fc.assert(
      fc.property(range(2.5, 8), range(2, 6), range(30, 300), range(1, 1.5), (H, r, RTI, more) => {
        const time = at(H, r, RTI);
        expect(at(H, r, RTI * more)).toBeGreaterThanOrEqual(time - 0.05);
        expect(at(H, r * more, RTI)).toBeGreaterThanOrEqual(time - 0.05);
      }),
      { numRuns: 40 },
    );
  });

  it('takes points at almost the same time as a jump', () => {
    const t = [0, 4e-323, 100, 100, 1000];
    expect(run({ t, Q: [1e6, 0, 0, 2000, 2000], H: 4, r: 3, RTI: 100 }).time).toBeGreaterThan(100);
  });

  it('responds at once where it is already warm enough, never without a fire', () => {
    const idle = { t: [0, 100], Q: [0, 0], H: 4, r: 3, RTI: 100 };
    expect(run(idle)).toEqual({ time: null, rate: null, hottest: 0 });
    expect(detectorResponse.run({ ...ROOM, ...idle, T_a: 60, T_act: 57 }).time).toBe(0);
    expect(smokeIndicator.run({ ...idle, place: 'free' }).time).toBeNull();
  });

  it.each([
    ['goes back', { t: [0, 10, 5], Q: [0, 1, 2] }],
    ['as many', { t: [0, 10], Q: [0, 1, 2] }],
    ['fewer than two', { t: [0], Q: [0] }],
  ])('says so when a curve %s', (why, curve) => {
    expect(() => run({ ...curve, H: 4, r: 3, RTI: 100 })).toThrow(
      why === 'goes back' ? /go back at point 3/ : new RegExp(why),
    );
  });
});
