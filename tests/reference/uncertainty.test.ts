import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { UNCERTAINTY_ROWS } from './rows/uncertainty-rows.ts';

describe('uncertainty against the outside world', () => {
  it.each(UNCERTAINTY_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
