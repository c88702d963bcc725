import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { buildWebWhenStale } from './build-web-when-stale.mjs';
import { command } from './say.mjs';

await command(() => buildWebWhenStale(join(dirname(fileURLToPath(import.meta.url)), '..', '..')));
