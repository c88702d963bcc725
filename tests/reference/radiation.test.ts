import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { RADIATION_ROWS } from './rows/radiation-rows.ts';

describe('radiation against the outside world', () => {
  it.each(RADIATION_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
