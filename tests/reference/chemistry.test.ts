import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { CHEMISTRY_ROWS } from './rows/chemistry-rows.ts';
import { FUEL_ROWS } from './rows/fuel-rows.ts';

describe('chemistry against the outside world', () => {
  it.each([...CHEMISTRY_ROWS, ...FUEL_ROWS].map((row) => [rowTitle(row), row] as const))('%s', (_title, row) =>
    checkRow(row),
  );
});
