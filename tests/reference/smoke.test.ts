import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { SMOKE_ROWS } from './rows/smoke-rows.ts';

describe('smoke against the outside world', () => {
  it.each(SMOKE_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
