import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import type { ReferenceRow } from '../reference/reference-row.ts';
import { root } from './import-graph.ts';

const ROWS = join(root, 'tests', 'reference', 'rows');

export type HeldRow = Pick<ReferenceRow, 'id' | 'method' | 'origin' | 'source'>;

/** Every value from outside that a method is held to, whatever list it stands in. */
export async function referenceRows(): Promise<readonly HeldRow[]> {
  const modules = await Promise.all(
    readdirSync(ROWS)
      .filter((name) => name.endsWith('-rows.ts'))
      .sort()
      .map((name) => import(join(ROWS, name)) as Promise<Record<string, readonly ReferenceRow[]>>),
  );
  return modules.flatMap((module) => Object.values(module).flat());
}
