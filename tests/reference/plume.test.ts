import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { PLUME_ROWS } from './rows/plume-rows.ts';

describe('plume against the outside world', () => {
  it.each(PLUME_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
