import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { GROWTH_ROWS } from './rows/growth-rows.ts';

describe('growth against the outside world', () => {
  it.each(GROWTH_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
