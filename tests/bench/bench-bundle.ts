import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { root } from '../support/import-graph.ts';
import { atMost, type BenchRow } from './bench-row.ts';

interface Chunk {
  readonly file: string;
  readonly imports?: readonly string[];
  readonly dynamicImports?: readonly string[];
}

const dist = join(root, 'web', 'dist');

/** Kilobytes (1000 bytes) of script after gzip, as the size budgets count them. */
function kilobytes(files: ReadonlySet<string>): number {
  let bytes = 0;
  for (const file of files) if (file.endsWith('.js')) bytes += gzipSync(readFileSync(join(dist, file))).length;
  return bytes / 1000;
}

/** Another page, fetched when it is gone to: its script is no part of the page that links there. */
const isPage = (key: string): boolean => /\/pages\/[a-z-]+-page\.tsx$/.test(key);

/**
 * Script a browser loads on the way: the entry and the sign-in page; the entry and the Book's page (the plan can be
 * edited); the Book with everything it loads afterwards, its worker included.
 */
export function benchBundle(): Promise<readonly BenchRow[]> {
  const manifest = JSON.parse(readFileSync(join(dist, '.vite', 'manifest.json'), 'utf8')) as Record<string, Chunk>;
  const reach = (starts: readonly string[], dynamic: boolean): Set<string> => {
    const files = new Set<string>();
    const seen = new Set<string>();
    const visit = (key: string): void => {
      const chunk = manifest[key];
      if (chunk === undefined || seen.has(key)) return;
      seen.add(key);
      files.add(chunk.file);
      chunk.imports?.forEach(visit);
      if (dynamic) chunk.dynamicImports?.filter((below) => !isPage(below)).forEach(visit);
    };
    starts.forEach(visit);
    return files;
  };
  const page = (name: string): string => {
    const key = Object.keys(manifest).find((candidate) => candidate.endsWith(`pages/${name}.tsx`));
    if (key === undefined) throw new Error(`The build has no chunk for the page ${name}.`);
    return key;
  };
  const entry = 'index.html';
  const signIn = reach([entry, page('sign-in-page')], false);
  const editable = reach([entry, page('book-page')], false);
  const workers = Object.keys(manifest).filter((key) => key.endsWith('-worker.ts'));
  const book = new Set([...editable, ...reach([page('book-page'), ...workers], true)]);
  return Promise.resolve([
    atMost('script of the first route (sign-in), gzip', kilobytes(signIn), 'kB', 170),
    atMost('script before the plan can be edited, gzip', kilobytes(editable), 'kB', 300),
    atMost('script of all of the Book, gzip', kilobytes(book), 'kB', 460),
  ]);
}
