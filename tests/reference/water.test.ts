import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { WATER_ROWS } from './rows/water-rows.ts';

describe('water against the outside world', () => {
  it.each(WATER_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
