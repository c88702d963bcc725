import { randomUUID } from 'node:crypto';
import { mkdir, open, readFile, rename, rm } from 'node:fs/promises';
import { join } from 'node:path';
import type { FileStore } from './file-store.ts';

const KEY = /^[a-z0-9][a-z0-9.-]{0,199}$/;

const isMissing = (error: unknown): boolean =>
  typeof error === 'object' && error !== null && 'code' in error && error.code === 'ENOENT';

/** Files in a folder of this machine: written under another name, flushed to the disk, then renamed. */
export class FolderFileStore implements FileStore {
  private readonly folder: string;

  constructor(folder: string) {
    this.folder = folder;
  }

  readonly put = async (key: string, bytes: Uint8Array): Promise<void> => {
    const path = this.path(key);
    await mkdir(this.folder, { recursive: true, mode: 0o700 });
    const unfinished = join(this.folder, `.${randomUUID()}.part`);
    const file = await open(unfinished, 'wx', 0o600);
    try {
      try {
        await file.writeFile(bytes);
        await file.sync();
      } finally {
        await file.close();
      }
      await rename(unfinished, path);
    } catch (error) {
      await rm(unfinished, { force: true });
      throw error;
    }
    const folder = await open(this.folder, 'r');
    try {
      await folder.sync();
    } finally {
      await folder.close();
    }
  };

  readonly get = async (key: string): Promise<Uint8Array | null> => {
    try {
      return await readFile(this.path(key));
    } catch (error) {
      if (isMissing(error)) return null;
      throw error;
    }
  };

  readonly remove = async (key: string): Promise<void> => {
    await rm(this.path(key), { force: true });
  };

  private path(key: string): string {
    if (!KEY.test(key) || key.includes('..')) throw new Error(`"${key}" is no name for a file.`);
    return join(this.folder, key);
  }
}
