import type { Readable } from 'node:stream';

/** A file that has arrived under no name yet; it is either kept or dropped. */
export interface StagedFile {
  readonly bytes: number;
  /** SHA-256 of the content, hexadecimal. */
  readonly sha256: string;
  /** Gives it its name; whatever had the name before is replaced whole. */
  readonly keep: (key: string) => Promise<void>;
  /** Forgets it. Doing so after `keep` changes nothing. */
  readonly drop: () => Promise<void>;
}

/** Where files are kept. A file is there whole or not at all. Keys are of letters, digits, dots and hyphens, made by the program. */
export interface FileStore {
  readonly put: (key: string, bytes: Uint8Array) => Promise<void>;
  /** Takes a file in piece by piece; when the pieces break off, nothing of it is left and the error goes on to the caller. */
  readonly stage: (pieces: AsyncIterable<Uint8Array>) => Promise<StagedFile>;
  /** @returns null when there is no such file */
  readonly get: (key: string) => Promise<Uint8Array | null>;
  /** A file piece by piece. @returns null when there is no such file */
  readonly read: (key: string) => Promise<{ readonly bytes: number; readonly pieces: Readable } | null>;
  readonly remove: (key: string) => Promise<void>;
  /** Removes what a process that died left half-arrived before a moment. */
  readonly removeUnfinished: (before: Date) => Promise<void>;
}
