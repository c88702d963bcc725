import { describe, it } from 'vitest';
import { parametricCurve, parametricTemperature } from '@embertally/shared/methods/burnout/parametric-curve';
import { checkRow, expectOutput, rowTitle } from './check-row.ts';
import { BURNOUT_ROWS } from './rows/burnout-rows.ts';

/** Gas temperatures at a time are no outputs of the method; they are read from the curve it returns. */
const AT_MINUTES = { at15: 15, at60: 60 } as const;

describe('burn-out against the outside world', () => {
  it.each(BURNOUT_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => {
    const { at15, at60, ...expected } = row.expected;
    checkRow({ ...row, expected });
    for (const [name, temperature] of Object.entries({ at15, at60 })) {
      if (temperature === undefined) continue;
      const fire = parametricCurve.run(row.inputs as Parameters<typeof parametricCurve.run>[0]);
      const minutes = AT_MINUTES[name as keyof typeof AT_MINUTES];
      expectOutput(parametricTemperature(fire, minutes), temperature, row.tolerance, name);
    }
  });
});
