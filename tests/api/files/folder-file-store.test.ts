import { mkdtempSync, readdirSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { FolderFileStore } from '../../../api/src/files/folder-file-store.ts';

let folder: string;
let store: FolderFileStore;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'embertally-store-'));
  store = new FolderFileStore(join(folder, 'files'));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

const bytes = (text: string): Uint8Array => new TextEncoder().encode(text);
const text = (found: Uint8Array | null): string | null => (found === null ? null : Buffer.from(found).toString());

describe('a file', () => {
  it('comes back as it went in, is replaced whole, and goes', async () => {
    await store.put('a.pdf', bytes('one'));
    expect(text(await store.get('a.pdf'))).toBe('one');
    await store.put('a.pdf', bytes('two, longer'));
    expect(text(await store.get('a.pdf'))).toBe('two, longer');
    await store.remove('a.pdf');
    expect(await store.get('a.pdf')).toBeNull();
    await store.remove('a.pdf');
  });

  it('is readable by the program only and leaves nothing half-done beside it', async () => {
    await store.put('a.pdf', bytes('one'));
    expect(readdirSync(join(folder, 'files'))).toEqual(['a.pdf']);
    expect(statSync(join(folder, 'files', 'a.pdf')).mode & 0o077).toBe(0);
  });

  it('that cannot be written leaves neither a file nor a part of one', async () => {
    writeFileSync(join(folder, 'taken'), '');
    await expect(new FolderFileStore(join(folder, 'taken')).put('a.pdf', bytes('x'))).rejects.toThrow();
    expect(readdirSync(folder)).toEqual(['taken']);
  });

  it.each(['../a', 'a/b', '.a', '', 'A.pdf', 'a..b', 'x'.repeat(300), 'a\0b'])('is never called %j', async (name) => {
    await expect(store.put(name, bytes('x'))).rejects.toThrow(/no name/);
    await expect(store.get(name)).rejects.toThrow(/no name/);
  });
});
