import { describe, expect, it } from 'vitest';
import { estimate, estimateOutputs, OutOfRangeError } from '@embertally/shared/methods/estimate';
import { designFire } from '@embertally/shared/methods/growth/design-fire';
import { perFloor } from '@embertally/shared/methods/load/per-floor';
import { detectorSteady } from '@embertally/shared/methods/plume/detector-steady';
import { flashoverThomas } from '@embertally/shared/methods/room/flashover-thomas';

describe('an estimate', () => {
  it('is a value with its unit and method, and nothing else unless workings are asked for', () => {
    expect(estimate(perFloor, { Q: 1000, A_f: 20 })).toEqual({
      value: 50,
      unit: 'MJ/m2',
      method: 'load.per-floor@1',
      warnings: [],
    });
  });

  it('says in its working what went in, where it came from, and how it was done', () => {
    const worked = estimate(perFloor, { Q: 1000, A_f: 20 }, { workings: true, origins: { A_f: 'measured' } });
    expect(worked.inputs).toMatchObject([
      { symbol: 'Q_fi,k', unit: 'MJ', value: 1000, origin: 'computed' },
      { symbol: 'A_f', unit: 'm2', value: 20, origin: 'measured' },
    ]);
    expect(worked.steps?.[0]).toMatchObject({ equation: 'q_f,k = Q_fi,k / A_f' });
    expect(worked.steps?.at(-1)).toMatchObject({ value: 50, unit: 'MJ/m2' });
    expect(worked.sources?.[0]?.title).toContain('EN 1991-1-2');
  });

  it('warns outside a range and names the input, the value and the range', () => {
    const { warnings, value } = estimate(flashoverThomas, { A_T: 900, F: 10, A_f: 200 });
    expect(value).toBe(7.8 * 900 + 3780);
    expect(warnings).toEqual([
      { code: 'OUT_OF_RANGE', text: 'Floor area is 200 m2; the method is made for 0 to 150 m2.' },
    ]);
  });

  it('refuses where the method refuses, rather than give a number', () => {
    expect(() => estimate(perFloor, { Q: 1000, A_f: 0 })).toThrow(OutOfRangeError);
    expect(() => estimate(perFloor, { Q: NaN, A_f: 10 })).toThrow(OutOfRangeError);
  });

  it('says never with a reason and no value', () => {
    const never = estimate(perFloor, { Q: 1, A_f: 1 }, { never: 'It does not happen.', workings: true });
    expect(never).toMatchObject({ value: null, unit: 'MJ/m2', never: 'It does not happen.' });
  });

  it('reads several numbers from one run, each with its own unit', () => {
    const run = estimateOutputs(designFire, { E: 9000, Q_max: 1e5, alpha: 0.0444444 });
    expect(run.of('peak').unit).toBe('kW');
    expect(run.of('end').unit).toBe('s');
    expect(run.of('end').method).toBe('growth.design-fire-2002@1');
    expect(() => run.of('plateauReached')).toThrow(TypeError);
  });

  it('an event that a method says never comes needs its reason, and is never a number', () => {
    const cool = { RTI: 50, rise: 12, u: 1, T_a: 20, T_act: 68 };
    const never = 'The gas does not get warm enough.';
    expect(estimateOutputs(detectorSteady, cool, { never }).of('time')).toMatchObject({ value: null, never });
    expect(() => estimateOutputs(detectorSteady, cool).of('time')).toThrow(OutOfRangeError);
  });
});
