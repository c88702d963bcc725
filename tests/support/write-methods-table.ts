import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './import-graph.ts';
import { methodsTable } from './methods-table.ts';

/** `npm run safety`: writes the tables of methods at the end of SAFETY.md anew. */
const file = join(root, 'SAFETY.md');
const before = readFileSync(file, 'utf8').replace(/\n## Methods\n[\s\S]*$/, '');
const note = `Made by \`npm run safety\` from what each method declares and from the reference rows in \`tests/reference/rows\`.

- **range**: what the method was tested or printed for. Outside, the number is *warned* of or the method *refuses*; a range that begins at 0 or at a tiny number only keeps out what
  cannot be.
- **held to**: how many values from outside the code it is tested against: *published* ones, ones *independently computed* by another implementation, by hand or by a second reader who had
  not seen the code, and *invariants* that every right implementation has.
- ***from memory***: the source was not read again when the value or the relation was written down.
- **known limits**: what is known against it first, then what it takes for granted. Mistakes that are easy to make in this trade have a test each, in
  \`tests/reference/traps.test.ts\` and \`traps-of-data.test.ts\`.`;
writeFileSync(file, `${before}\n## Methods\n\n${note}\n\n${await methodsTable()}`);
