import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { FURTHER_ROWS } from './rows/further-rows.ts';

describe('relations beside the tally against the outside world', () => {
  it.each(FURTHER_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
