import { createHash, randomUUID } from 'node:crypto';
import { mkdir, open, readFile, readdir, rename, rm, stat } from 'node:fs/promises';
import { join } from 'node:path';
import type { FileStore, StagedFile } from './file-store.ts';

const KEY = /^[a-z0-9][a-z0-9.-]{0,199}$/;
const UNFINISHED = /^\.[0-9a-f-]{36}\.part$/;

const isMissing = (error: unknown): boolean =>
  typeof error === 'object' && error !== null && 'code' in error && error.code === 'ENOENT';

/** What a promise gives, or null where the file it is about is not there. */
async function unlessMissing<T>(work: Promise<T>): Promise<T | null> {
  try {
    return await work;
  } catch (error) {
    if (isMissing(error)) return null;
    throw error;
  }
}

/** Files in a folder of this machine: written under another name, flushed to the disk, then renamed. */
export class FolderFileStore implements FileStore {
  private readonly folder: string;

  constructor(folder: string) {
    this.folder = folder;
  }

  readonly put = async (key: string, bytes: Uint8Array): Promise<void> => {
    this.path(key);
    const staged = await this.stage(one(bytes));
    await staged.keep(key);
  };

  readonly stage = async (pieces: AsyncIterable<Uint8Array>): Promise<StagedFile> => {
    await mkdir(this.folder, { recursive: true, mode: 0o700 });
    const unfinished = join(this.folder, `.${randomUUID()}.part`);
    const hash = createHash('sha256');
    let bytes = 0;
    const file = await open(unfinished, 'wx', 0o600);
    try {
      try {
        for await (const piece of pieces) {
          hash.update(piece);
          bytes += piece.byteLength;
          await file.writeFile(piece);
        }
        await file.sync();
      } finally {
        await file.close();
      }
    } catch (error) {
      await rm(unfinished, { force: true });
      throw error;
    }
    return {
      bytes,
      sha256: hash.digest('hex'),
      keep: (key) => this.rename(unfinished, this.path(key)),
      drop: () => rm(unfinished, { force: true }),
    };
  };

  readonly get = async (key: string): Promise<Uint8Array | null> => {
    const path = this.path(key);
    return unlessMissing<Uint8Array>(readFile(path));
  };

  readonly read: FileStore['read'] = async (key) => {
    const file = await unlessMissing(open(this.path(key), 'r'));
    if (file === null) return null;
    const { size } = await file.stat();
    return { bytes: size, pieces: file.createReadStream() };
  };

  readonly remove = async (key: string): Promise<void> => {
    await rm(this.path(key), { force: true });
  };

  readonly removeUnfinished = async (before: Date): Promise<void> => {
    for (const name of (await unlessMissing(readdir(this.folder))) ?? []) {
      if (!UNFINISHED.test(name)) continue;
      const path = join(this.folder, name);
      const found = await unlessMissing(stat(path));
      if (found !== null && found.mtime < before) await rm(path, { force: true });
    }
  };

  private async rename(from: string, to: string): Promise<void> {
    try {
      await rename(from, to);
    } catch (error) {
      await rm(from, { force: true });
      throw error;
    }
    const folder = await open(this.folder, 'r');
    try {
      await folder.sync();
    } finally {
      await folder.close();
    }
  }

  private path(key: string): string {
    if (!KEY.test(key) || key.includes('..')) throw new Error(`"${key}" is no name for a file.`);
    return join(this.folder, key);
  }
}

async function* one(bytes: Uint8Array): AsyncIterable<Uint8Array> {
  await Promise.resolve();
  yield bytes;
}
