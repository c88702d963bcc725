import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { TEMPERATURE_ROWS } from './rows/temperature-rows.ts';

describe('temperature against the outside world', () => {
  it.each(TEMPERATURE_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
