import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { METHODS, MODELS } from '@embertally/shared/methods/registry';
import { rangeText } from '@embertally/shared/methods/range-faults';
import type { ReferenceRow } from '../reference/reference-row.ts';
import { root } from './import-graph.ts';

const ROWS = join(root, 'tests', 'reference', 'rows');
const HELD_TO = { published: 'published', independent: 'independently computed', invariant: 'invariant' } as const;
const cell = (text: string): string => text.replaceAll('|', '\\|');

async function referenceRows(): Promise<readonly ReferenceRow[]> {
  const modules = await Promise.all(
    readdirSync(ROWS)
      .filter((name) => name.endsWith('-rows.ts'))
      .sort()
      .map((name) => import(join(ROWS, name)) as Promise<Record<string, readonly ReferenceRow[]>>),
  );
  return modules.flatMap((module) => Object.values(module).flat());
}

/** The table of methods as it stands in SAFETY.md, made of what the methods declare and of the rows that hold them. */
export async function methodsTable(): Promise<string> {
  const rows = await referenceRows();
  const lines = [...METHODS, ...MODELS].map((method) => {
    const sources = method.sources
      .map(
        (s) =>
          `${s.title}${s.edition === undefined ? '' : ` (${s.edition})`}, ${s.locator}${s.fromMemory === true ? ' *(from memory)*' : ''}`,
      )
      .join('; ');
    const ranges = Object.values(method.inputs)
      .flatMap((input) =>
        'choices' in input
          ? []
          : [`${input.symbol || input.quantity} ${rangeText(input.valid)}${input.unit === '' ? '' : ` ${input.unit}`}`],
      )
      .join('; ');
    const held = (Object.keys(HELD_TO) as (keyof typeof HELD_TO)[])
      .map(
        (origin) =>
          [rows.filter((row) => row.method === method.id && row.origin === origin).length, HELD_TO[origin]] as const,
      )
      .flatMap(([count, word]) => (count > 0 ? [`${count} ${word}`] : []))
      .join(', ');
    const gives = `${method.title}, ${method.symbol}${method.unit === '' ? '' : ` in ${method.unit}`}`;
    const outside = method.outOfRange === 'warn' ? 'warned' : 'refused';
    return `| \`${method.id}\` | ${cell(gives)} | ${cell(sources)} | ${cell(ranges || 'named cases only')} (${outside}) | ${held} | ${method.version} |`;
  });
  const head =
    '| method | what it gives | source | range (outside: warned or refused) | held to | version |\n|---|---|---|---|---|---|';
  return `${head}\n${lines.join('\n')}\n`;
}
