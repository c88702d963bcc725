import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { STATISTICS_ROWS } from './rows/statistics-rows.ts';

describe('statistics against the outside world', () => {
  it.each(STATISTICS_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
