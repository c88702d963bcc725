/** Where files are kept. A file is there whole or not at all. */
export interface FileStore {
  /** @param key a name of letters, digits, dots and hyphens, made by the program */
  readonly put: (key: string, bytes: Uint8Array) => Promise<void>;
  /** @returns null when there is no such file */
  readonly get: (key: string) => Promise<Uint8Array | null>;
  readonly remove: (key: string) => Promise<void>;
}
