import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { root } from '../support/import-graph.ts';
import { atMost, median, type BenchRow } from './bench-row.ts';

/** Seconds from the command to the first answer of `/api/health/ready`, and the stop that follows. */
async function secondsToReady(data: string, port: number): Promise<number> {
  const began = performance.now();
  const child = spawn(process.execPath, [join(root, 'api', 'scripts', 'start.mjs')], {
    cwd: root,
    env: { ...process.env, DATA_DIR: data, PORT: String(port), NODE_ENV: 'production' },
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  let seconds = Number.NaN;
  child.stdout.on('data', (chunk: Buffer) => {
    if (Number.isNaN(seconds) && chunk.toString().includes('Embertally is at')) {
      seconds = (performance.now() - began) / 1000;
      child.kill('SIGTERM');
    }
  });
  const [code] = (await once(child, 'exit')) as [number | null];
  if (code !== 0 || Number.isNaN(seconds)) throw new Error(`The start command ended with ${code} before it was ready.`);
  return seconds;
}

/** Packages and the build are there: first start makes the cluster and seeds the demo book, later starts find them. */
export async function benchStart(): Promise<readonly BenchRow[]> {
  const data = mkdtempSync(join(tmpdir(), 'embertally-start-'));
  try {
    const cold = await secondsToReady(data, 3917);
    const warm: number[] = [];
    for (let round = 0; round < 5; round += 1) warm.push(await secondsToReady(data, 3917));
    return [
      atMost('npm start with an empty data folder (cluster made, demo seeded)', cold, 's', null),
      atMost('npm start warm, to ready (median of 5)', median(warm), 's', 5),
    ];
  } finally {
    rmSync(data, { recursive: true, force: true });
  }
}
