import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { root } from './import-graph.ts';
import type { TestDatabase } from './test-database.ts';

export interface RunningServer {
  readonly url: string;
  /** What the process printed, for a test that looks into the log. */
  readonly output: () => string;
  readonly process: ChildProcess;
  readonly stop: () => Promise<void>;
}

async function freePort(): Promise<number> {
  const server = createServer().listen(0, '127.0.0.1');
  await once(server, 'listening');
  const address = server.address();
  server.close();
  if (address === null || typeof address === 'string') throw new Error('no port was free');
  return address.port;
}

const READY_MS = 60_000;

/** The real process as `npm start` runs it, on a test's own database, serving the built web client. */
export async function startServer(database: TestDatabase, env: Record<string, string> = {}): Promise<RunningServer> {
  const port = await freePort();
  const url = `http://127.0.0.1:${port}`;
  const data = mkdtempSync(join(tmpdir(), 'embertally-e2e-'));
  const child = spawn(process.execPath, ['--import', 'tsx', 'src/index.ts'], {
    cwd: join(root, 'api'),
    env: {
      ...process.env,
      NODE_ENV: 'production',
      DATABASE_URL: database.appUrl,
      MIGRATION_DATABASE_URL: database.ownerUrl,
      PORT: String(port),
      HOST: '127.0.0.1',
      BASE_URL: url,
      DATA_DIR: data,
      DEMO: '0',
      WEB_DIST: join(root, 'web', 'dist'),
      ...env,
    },
    stdio: ['ignore', 'pipe', 'pipe', 'ipc'],
  });
  let output = '';
  child.stdout?.on('data', (chunk: Buffer) => (output += chunk.toString()));
  child.stderr?.on('data', (chunk: Buffer) => (output += chunk.toString()));
  await new Promise<void>((ready, failed) => {
    const late = setTimeout(
      () => failed(new Error(`The server was not ready in ${READY_MS / 1000} s:\n${output}`)),
      READY_MS,
    );
    child.on('message', (message) => {
      if (message !== 'ready') return;
      clearTimeout(late);
      ready();
    });
    child.on('exit', (code) => failed(new Error(`The server ended with ${code}:\n${output}`)));
  });
  return {
    url,
    output: () => output,
    process: child,
    stop: async () => {
      if (child.exitCode === null && child.signalCode === null) {
        child.kill('SIGTERM');
        await once(child, 'exit');
      }
      rmSync(data, { recursive: true, force: true });
    },
  };
}
