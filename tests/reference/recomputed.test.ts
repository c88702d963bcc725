import { describe, expect, it } from 'vitest';
import { checkBasis } from '@embertally/shared/chemistry/basis-check';
import { OutOfRangeError } from '@embertally/shared/methods/estimate';
import { parametricCurve, parametricTemperature } from '@embertally/shared/methods/burnout/parametric-curve';
import { heatFromFormation } from '@embertally/shared/methods/chemistry/heat-from-formation';
import { designFire, designFireCurve } from '@embertally/shared/methods/growth/design-fire';
import { atoms } from './atoms.ts';
import { checkRow, rowTitle } from './check-row.ts';
import { RECOMPUTED_ENERGY_ROWS } from './rows/recomputed-energy-rows.ts';
import { RECOMPUTED_FIRE_ROWS } from './rows/recomputed-fire-rows.ts';
import { RECOMPUTED_ROOM_ROWS } from './rows/recomputed-room-rows.ts';

const rows = [...RECOMPUTED_ENERGY_ROWS, ...RECOMPUTED_ROOM_ROWS, ...RECOMPUTED_FIRE_ROWS];

describe('values of a second reader who had not seen the code', () => {
  it.each(rows.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));

  it('trichloroethylene runs out of hydrogen and gets no number', () => {
    expect(() => heatFromFormation.run({ ...atoms({ C: 2, H: 1, Cl: 3 }), dH_f: -42.3 })).toThrow(OutOfRangeError);
  });

  it('5315 kJ for two moles of butane taken for one: 25.554 MJ per kg of oxygen, and half of it is proposed', () => {
    const { perOxygen, finding, factor } = checkBasis(atoms({ C: 4, H: 10 }), 5315);
    expect(perOxygen).toBeCloseTo(25.554482, 5);
    expect([finding, factor]).toEqual(['wrong-mole-basis', 0.5]);
  });

  it('6400 MJ under 3200 kW still give 1810.4 kW after 2100 s, in the decay', () => {
    const points = designFireCurve(designFire.run({ E: 6400, Q_max: 3200, alpha: 1000 / 150 ** 2 }));
    const after = points.findIndex(([t]) => t >= 2100);
    const [[t0, q0], [t1, q1]] = [points[after - 1]!, points[after]!];
    expect(q0 + ((q1 - q0) * (2100 - t0)) / (t1 - t0)).toBeCloseTo(1810.3612, 3);
  });

  it.each([
    ['ventilation controlled', { O: 0.055, b: 1250, q_td: 180, t_lim: 20 / 60 }, 70, 550.7353],
    ['fuel controlled', { O: 0.09, b: 900, q_td: 65, t_lim: 0.25 }, 18, 514.2012],
  ] as const)('a %s fire while it cools', (_name, inputs, minutes, temperature) => {
    expect(parametricTemperature(parametricCurve.run(inputs), minutes)).toBeCloseTo(temperature, 3);
  });
});
