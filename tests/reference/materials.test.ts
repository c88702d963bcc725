import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { MATERIAL_ROWS } from './rows/material-rows.ts';

describe('own materials against the outside world', () => {
  it.each(MATERIAL_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
