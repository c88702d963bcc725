import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { equivalentTime } from '@embertally/shared/methods/burnout/equivalent-time';
import { hydrocarbonCurve, standardCurve } from '@embertally/shared/methods/burnout/nominal-curves';
import { parametricCurve, parametricTemperature } from '@embertally/shared/methods/burnout/parametric-curve';
import { ventilationWeight } from '@embertally/shared/methods/burnout/ventilation-weight';
import { heatFromFormation } from '@embertally/shared/methods/chemistry/heat-from-formation';
import { designFire } from '@embertally/shared/methods/growth/design-fire';
import { netAsReceived } from '@embertally/shared/methods/heat/net-as-received';
import { netFromGross } from '@embertally/shared/methods/heat/net-from-gross';
import { deltaQ1 } from '@embertally/shared/methods/load/delta-q1';
import { ceilingJet } from '@embertally/shared/methods/plume/ceiling-jet';
import { flameHeight } from '@embertally/shared/methods/plume/flame-height';
import { pointSource } from '@embertally/shared/methods/radiation/point-source';
import { viewCylinder } from '@embertally/shared/methods/radiation/view-cylinder';
import { viewRectangle } from '@embertally/shared/methods/radiation/view-rectangle';
import { hotLayerMqh } from '@embertally/shared/methods/room/hot-layer-mqh';
import { liningHeatTransfer } from '@embertally/shared/methods/room/lining-heat-transfer';
import { visibility } from '@embertally/shared/methods/smoke/visibility';
import { gumbelFractile } from '@embertally/shared/methods/statistics/gumbel-fractile';
import { gumbelPlace } from '@embertally/shared/methods/statistics/gumbel-place';
import { lognormalFractile } from '@embertally/shared/methods/statistics/lognormal-fractile';
import { lognormalPlace } from '@embertally/shared/methods/statistics/lognormal-place';
import { atoms } from '../../reference/atoms.ts';

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** Never falls (or never rises) when its one argument grows. */
function expectMonotonic(of: (x: number) => number, [low, high]: readonly [number, number], rises: boolean) {
  fc.assert(
    fc.property(number(low, high), number(low, high), (a, b) => {
      const [near, far] = [of(Math.min(a, b)), of(Math.max(a, b))];
      const slack = 1e-9 * Math.max(Math.abs(near), Math.abs(far), 1);
      if (rises) expect(far).toBeGreaterThanOrEqual(near - slack);
      else expect(far).toBeLessThanOrEqual(near + slack);
    }),
  );
}

describe('where the physics is monotonic, so are the numbers', () => {
  it.each<[string, (x: number) => number, readonly [number, number], boolean]>([
    ['the flame grows with the rate', (Q) => flameHeight.run({ Q, D: 1, ratio: 10 }), [0, 50_000], true],
    ['the flame shrinks with the base', (D) => flameHeight.run({ Q: 1000, D, ratio: 10 }), [0.1, 10], false],
    ['the jet warms with the rate', (Q) => ceilingJet.run({ Q, H: 4, r: 3, place: 'free' }).rise, [0, 50_000], true],
    ['the jet cools with height', (H) => ceilingJet.run({ Q: 1000, H, r: 3, place: 'free' }).rise, [3, 15], false],
    [
      'the layer warms with the rate',
      (Q) => hotLayerMqh.run({ Q, h_k: 0.03, A_T: 90, F: 2, position: 'centre' }),
      [0, 5000],
      true,
    ],
    [
      'the layer cools with openings',
      (F) => hotLayerMqh.run({ Q: 800, h_k: 0.03, A_T: 90, F, position: 'centre' }),
      [0.1, 20],
      false,
    ],
    [
      'linings take less heat with time',
      (t) => liningHeatTransfer.run({ t, k: [0.48], rho: [1440], c: [840], d: [0.016] }).h_k,
      [1, 7200],
      false,
    ],
    ['the standard curve rises', (t) => standardCurve.run({ t }), [0, 600], true],
    ['the hydrocarbon curve rises', (t) => hydrocarbonCurve.run({ t }), [0, 600], true],
    ['more load burns longer', (q_fd) => equivalentTime.run({ q_fd, k_b: 0.07, w_f: 1, k_c: 1 }), [0, 3000], true],
    [
      'openings shorten the exposure',
      (alpha_v) => ventilationWeight.run({ H: 3, alpha_v, alpha_h: 0 }).w_f,
      [0.025, 0.25],
      false,
    ],
    ['larger compartments weigh more', (A_f) => deltaQ1.run({ A_f, reading: 'linear' }), [0, 12_000], true],
    ['more heat burns longer', (E) => designFire.run({ E, Q_max: 3000, alpha: 0.0444 }).end, [1, 1e5], true],
    ['radiation falls with distance', (R) => pointSource.run({ Q: 1000, chi_r: 0.35, R, ratio: 5 }), [0.5, 50], false],
    ['a panel shrinks with distance', (s) => viewRectangle.run({ a: 3, b: 2, s }).centre, [0.1, 50], false],
    ['a cylinder shrinks with distance', (L) => viewCylinder.run({ L, H: 5, D: 2 }).most, [1.1, 60], false],
    ['smoke hides more with soot', (m) => visibility.run({ m, V: 150 }).reflecting, [0, 5], false],
    ['water takes heat away', (w) => netAsReceived.run({ H_dry: 18, w }), [0, 0.8], false],
  ])('%s', (_name, of, range, rises) => expectMonotonic(of, range, rises));

  it('a fractile rises with its probability and leads back to it', () => {
    fc.assert(
      fc.property(number(50, 2000), number(0.05, 0.5), number(0.05, 0.98), (mean, V, p) => {
        const gumbel = gumbelFractile.run({ mean, V, p });
        expect(gumbelFractile.run({ mean, V, p: p + 0.01 })).toBeGreaterThan(gumbel);
        expect(gumbelPlace.run({ q: gumbel, mean, V })).toBeCloseTo(100 * p, 6);
        const lognormal = lognormalFractile.run({ mean, V, p });
        expect(lognormalPlace.run({ q: lognormal, mean, V })).toBeCloseTo(100 * p, 5);
      }),
    );
  });
});

describe('net and gross', () => {
  it('net is never above gross, by formula or by hydrogen, and equal without hydrogen', () => {
    const count = fc.integer({ min: 0, max: 40 });
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 40 }), count, count, number(-500, 500), (C, H, O, dH_f) => {
        fc.pre(C + H / 4 - O / 2 > 0.25);
        const { net, gross } = heatFromFormation.run({ ...atoms({ C, H, O }), dH_f });
        if (H === 0) expect(net).toBe(gross);
        else expect(net).toBeLessThan(gross);
      }),
    );
    fc.assert(
      fc.property(number(25, 150), number(0, 1), (H_gross, w_H) => {
        expect(netFromGross.run({ H_gross, w_H })).toBeLessThanOrEqual(H_gross);
      }),
    );
  });
});

describe('the parametric curve', () => {
  const fire = fc.record({
    O: number(0.02, 0.2),
    b: number(400, 2200),
    q_td: number(80, 1000),
    t_lim: number(0.25, 0.5),
  });

  it('heats without falling, cools without rising, and has no step in time', () => {
    fc.assert(
      fc.property(fire, number(0, 1), (inputs, share) => {
        const curve = parametricCurve.run(inputs);
        const at = (minutes: number) => parametricTemperature(curve, minutes);
        const early = share * curve.timeOfPeak;
        expect(at(early)).toBeLessThanOrEqual(at(curve.timeOfPeak) + 1e-9);
        const late = curve.timeOfPeak + share * (curve.end - curve.timeOfPeak);
        expect(at(late + 0.1)).toBeLessThanOrEqual(at(late) + 1e-9);
        expect(at(curve.timeOfPeak + 1e-7)).toBeCloseTo(curve.peak, 2);
        expect(at(curve.end)).toBeCloseTo(20, 6);
      }),
    );
  });

  it('steps with the load at one place only: where the openings take over from the fuel', () => {
    const peak = (q_td: number) => parametricCurve.run({ O: 0.04, b: 1160, q_td, t_lim: 1 / 3 }).peak;
    const jump = (1 / 3) * (0.04 / 0.2e-3);
    const steps: number[] = [];
    for (let q = 50; q < 400; q += 0.25) if (Math.abs(peak(q + 0.25) - peak(q)) > 5) steps.push(q);
    expect(steps).toHaveLength(1);
    expect(Math.abs(steps[0]! - jump)).toBeLessThan(0.25);
    expect(peak(jump + 1e-6) - peak(jump - 1e-6)).toBeGreaterThan(200);
  });
});

describe('the design fire', () => {
  it('passes from no plateau to a plateau without a step', () => {
    const alpha = 0.0444;
    const Q_max = 4000;
    const meeting = (Q_max * Math.sqrt(Q_max / alpha)) / 3 / 0.7 / 1000;
    const [below, above] = [meeting * (1 - 1e-9), meeting * (1 + 1e-9)].map((E) => designFire.run({ E, Q_max, alpha }));
    expect([below!.plateauReached, above!.plateauReached]).toEqual([false, true]);
    for (const key of ['peak', 'growthEnd', 'decayStart', 'end'] as const)
      expect(below![key] / above![key]).toBeCloseTo(1, 6);
  });
});
