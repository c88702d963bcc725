import { describe, expect, it } from 'vitest';
import { METHODS, MODELS } from '@embertally/shared/methods/registry';
import { KNOWN_LIMITS } from '../../support/known-limits.ts';
import { methodsTable } from '../../support/methods-table.ts';

const ids = [...METHODS, ...MODELS].map(({ id }) => id);

describe('what is known against the methods', () => {
  it('names methods that exist, in whole sentences', () => {
    expect(Object.keys(KNOWN_LIMITS).filter((id) => !ids.includes(id))).toEqual([]);
    for (const text of Object.values(KNOWN_LIMITS)) expect(text).toMatch(/^\S.*\.$/);
  });

  it('leaves no cell of the table empty', async () => {
    const rows = (await methodsTable()).split('\n').filter((line) => line.startsWith('| `'));
    expect(rows).toHaveLength(ids.length);
    expect(rows.filter((row) => /\|\s*\|/.test(row))).toEqual([]);
  });
});
