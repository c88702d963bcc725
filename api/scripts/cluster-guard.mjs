import { once } from 'node:events';
import { setTimeout as wait } from 'node:timers/promises';
import { stopCluster } from './postgres.mjs';

/** Waits for its starter to end, gives the API its time to finish requests, and stops the cluster the starter began. */
const GRACE_MS = 2_000;
process.on('SIGINT', () => {});
process.on('SIGTERM', () => {});
process.stdin.resume();
await once(process.stdin, 'close');
await wait(GRACE_MS);
stopCluster(process.argv[2]);
