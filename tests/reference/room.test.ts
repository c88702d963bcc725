import { describe, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { ROOM_ROWS } from './rows/room-rows.ts';

describe('room against the outside world', () => {
  it.each(ROOM_ROWS.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));
});
