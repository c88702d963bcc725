import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { STORAGE_ROWS } from './rows/storage-rows.ts';

describe('stored goods against the outside world', () => {
  it.each(STORAGE_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
