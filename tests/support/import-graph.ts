import { existsSync, readFileSync, readdirSync } from 'node:fs';
import { dirname, join, relative, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import ts from 'typescript';

export const root = resolve(dirname(fileURLToPath(import.meta.url)), '..', '..');

/** Every TypeScript source below the given folders, as paths from the repository's top. */
export function sourceFiles(...folders: string[]): string[] {
  return folders.flatMap((folder) => {
    const full = join(root, folder);
    if (!existsSync(full)) return [];
    return readdirSync(full, { recursive: true, encoding: 'utf8' })
      .filter((name) => /\.(ts|tsx)$/.test(name) && !name.includes('node_modules') && !name.endsWith('.d.mts'))
      .map((name) => join(folder, name));
  });
}

export interface Imports {
  /** Files of the repository. */
  readonly files: readonly string[];
  readonly packages: readonly string[];
}

/** What a file imports, type-only and dynamic imports included: a type hides a knot as well as a value does. */
export function importsOf(file: string): Imports {
  const text = readFileSync(join(root, file), 'utf8');
  const files: string[] = [];
  const packages: string[] = [];
  for (const { fileName } of ts.preProcessFile(text, true, true).importedFiles) {
    const shared = /^@embertally\/shared\/(.+)$/.exec(fileName);
    if (shared) files.push(`shared/src/${shared[1]}.ts`);
    else if (fileName.startsWith('.'))
      files.push(relative(root, resolve(root, dirname(file), fileName.replace(/\?.*$/, ''))));
    else
      packages.push(
        fileName.startsWith('@') ? fileName.split('/').slice(0, 2).join('/') : (fileName.split('/')[0] ?? fileName),
      );
  }
  return { files, packages };
}

/** The shortest statement of a cycle, or null: depth first over the graph. */
export function findCycle(graph: ReadonlyMap<string, readonly string[]>): string[] | null {
  const state = new Map<string, 'open' | 'done'>();
  const path: string[] = [];
  const visit = (node: string): string[] | null => {
    if (state.get(node) === 'done') return null;
    if (state.get(node) === 'open') return [...path.slice(path.indexOf(node)), node];
    state.set(node, 'open');
    path.push(node);
    for (const next of graph.get(node) ?? []) {
      const cycle = graph.has(next) ? visit(next) : null;
      if (cycle) return cycle;
    }
    path.pop();
    state.set(node, 'done');
    return null;
  };
  for (const node of graph.keys()) {
    const cycle = visit(node);
    if (cycle) return cycle;
  }
  return null;
}
