import { describe, expect, it } from 'vitest';
import { checkRow, rowTitle } from './check-row.ts';
import { HANDBOOK_CHEMISTRY_ROWS } from './rows/handbook-chemistry-rows.ts';
import { HANDBOOK_FIRE_ROWS } from './rows/handbook-fire-rows.ts';
import { HANDBOOK_ROOM_ROWS } from './rows/handbook-room-rows.ts';

const rows = [...HANDBOOK_CHEMISTRY_ROWS, ...HANDBOOK_ROOM_ROWS, ...HANDBOOK_FIRE_ROWS];

describe('values that standards, handbooks and textbooks print', () => {
  it.each(rows.map((row) => [rowTitle(row), row] as const))('%s', (_title, row) => checkRow(row));

  it('are at least forty, each published, named once and with its source, over ten topics', () => {
    expect(rows.length).toBeGreaterThanOrEqual(40);
    expect(new Set(rows.map(({ id }) => id)).size).toBe(rows.length);
    expect(rows.filter(({ origin, source }) => origin !== 'published' || source.length < 10)).toEqual([]);
    expect(new Set(rows.map(({ method }) => method.split('.')[0])).size).toBeGreaterThanOrEqual(10);
  });
});
