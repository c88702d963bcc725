import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { POOL_ROWS } from './rows/pool-rows.ts';

describe('pool fires against the outside world', () => {
  it.each(POOL_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
