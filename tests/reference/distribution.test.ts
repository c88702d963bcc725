import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { DISTRIBUTION_ROWS } from './rows/distribution-rows.ts';

describe('distributions against the outside world', () => {
  it.each(DISTRIBUTION_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
