import { mkdtempSync, readdirSync, rmSync, statSync, utimesSync, writeFileSync } from 'node:fs';
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

describe('a file that comes in pieces', () => {
  async function* pieces(...parts: readonly (string | Error)[]): AsyncIterable<Uint8Array> {
    await Promise.resolve();
    for (const part of parts) {
      if (part instanceof Error) throw part;
      yield bytes(part);
    }
  }
  const names = (): string[] => readdirSync(join(folder, 'files'));

  it('has its length and hash, no name until it is kept, and is read in pieces', async () => {
    const staged = await store.stage(pieces('ab', 'c'));
    // SHA-256 of "abc": FIPS 180-2, appendix B.1.
    expect(staged).toMatchObject({
      bytes: 3,
      sha256: 'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad',
    });
    expect(await store.get('abc.csv')).toBeNull();
    await staged.keep('abc.csv');
    await staged.drop();
    expect(names()).toEqual(['abc.csv']);
    const read = await store.read('abc.csv');
    expect(read?.bytes).toBe(3);
    expect(Buffer.concat((await read?.pieces.toArray()) as Buffer[]).toString()).toBe('abc');
    expect(await store.read('none.csv')).toBeNull();
  });

  it('leaves nothing when the pieces break off or it is dropped', async () => {
    await expect(store.stage(pieces('ab', new Error('cut')))).rejects.toThrow('cut');
    await (await store.stage(pieces('ab'))).drop();
    expect(names()).toEqual([]);
  });

  it('that a dead process left half-arrived is removed, one that is arriving is not', async () => {
    await store.put('whole.csv', bytes('whole'));
    await store.stage(pieces('left behind'));
    const [left = ''] = names().filter((name) => name.endsWith('.part'));
    utimesSync(join(folder, 'files', left), new Date('2030-01-01'), new Date('2030-01-01'));
    await store.stage(pieces('arriving'));
    utimesSync(
      join(folder, 'files', names().find((name) => name.endsWith('.part') && name !== left) ?? ''),
      new Date('2030-01-03'),
      new Date('2030-01-03'),
    );
    await store.removeUnfinished(new Date('2030-01-02'));
    expect(names()).not.toContain(left);
    expect(names()).toHaveLength(2);
    await new FolderFileStore(join(folder, 'nothing yet')).removeUnfinished(new Date('2030-01-02'));
  });
});
