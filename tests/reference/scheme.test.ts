import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { SCHEME_ROWS } from './rows/scheme-rows.ts';

describe('other schemes against the outside world', () => {
  it.each(SCHEME_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
