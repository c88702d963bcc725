import { once } from 'node:events';
import { existsSync, readFileSync } from 'node:fs';
import { setTimeout as wait } from 'node:timers/promises';
import { stopCluster } from './postgres.mjs';

/** Waits for its starter to end, gives the API its time to finish requests, and stops the cluster if it is still the starter's. */
const GRACE_MS = 2_000;
process.on('SIGINT', () => {});
process.on('SIGTERM', () => {});
process.stdin.resume();
await once(process.stdin, 'close');
await wait(GRACE_MS);
const [folder, keeper, starter] = process.argv.slice(2);
if (existsSync(keeper) && readFileSync(keeper, 'utf8') === starter) stopCluster(folder);
