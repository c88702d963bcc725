import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { HEAT_ROWS } from './rows/heat-rows.ts';

describe('heat against the outside world', () => {
  it.each(HEAT_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
