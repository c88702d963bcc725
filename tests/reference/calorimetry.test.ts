import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { CALORIMETRY_ROWS } from './rows/calorimetry-rows.ts';

describe('calorimetry against the outside world', () => {
  it.each(CALORIMETRY_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
