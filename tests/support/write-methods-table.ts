import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './import-graph.ts';
import { methodsTable } from './methods-table.ts';

/** `npm run safety`: writes the table of methods at the end of SAFETY.md anew. */
const file = join(root, 'SAFETY.md');
const before = readFileSync(file, 'utf8').replace(/\n## Methods\n[\s\S]*$/, '');
const note =
  'Made by `npm run safety` from what each method declares and from the reference rows in `tests/reference/rows`. A value marked *from memory* was not read again in its source. Known\nmisprints and disagreements between sources stand in the files of the methods they touch and in `tests/reference/traps.test.ts`.';
writeFileSync(file, `${before}\n## Methods\n\n${note}\n\n${await methodsTable()}`);
