import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { LOAD_ROWS } from './rows/load-rows.ts';

describe('load against the outside world', () => {
  it.each(LOAD_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
