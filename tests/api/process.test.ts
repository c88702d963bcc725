import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { root } from '../support/import-graph.ts';
import { startServer } from '../support/running-server.ts';
import { createTestDatabase, type TestDatabase } from '../support/test-database.ts';

let database: TestDatabase;
beforeAll(async () => {
  database = await createTestDatabase();
});
afterAll(() => database.drop());

async function run(env: Record<string, string>): Promise<{ code: number | null; said: string }> {
  const child = spawn(process.execPath, ['--import', 'tsx', 'src/index.ts'], {
    cwd: join(root, 'api'),
    env: { PATH: process.env['PATH'] ?? '', ...env },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let said = '';
  child.stderr.on('data', (part: Buffer) => (said += part.toString()));
  const [code] = (await once(child, 'exit')) as [number | null];
  return { code, said };
}

describe('the process', () => {
  it('ends with one sentence when its settings cannot be used', async () => {
    const outcome = await run({ DATABASE_URL: database.appUrl, HOST: '0.0.0.0' });
    expect(outcome.code).toBe(1);
    expect(outcome.said).toMatch(/^HOST=0\.0\.0\.0 .*https.*\.\n$/);
  });

  it('finishes what it was asked when told to stop, and ends with 0', async () => {
    const server = await startServer(database, { LOG_LEVEL: 'warn' });
    const asked = Array.from({ length: 20 }, () => fetch(`${server.url}/api/openapi.json`));
    await Promise.any(asked);
    server.process.kill('SIGTERM');
    for (const answer of await Promise.all(asked)) expect(answer.status).toBe(200);
    if (server.process.exitCode === null) await once(server.process, 'exit');
    expect(server.process.exitCode).toBe(0);
    await server.stop();
  }, 60_000);

  it('stops when whoever started it is gone, and writes no secret into its log', async () => {
    const server = await startServer(database, { LOG_LEVEL: 'debug' });
    const canary = 'a canary of fifteen characters';
    const answer = await fetch(`${server.url}/api/sessions?token=${encodeURIComponent(canary)}`, {
      method: 'POST',
      headers: {
        origin: server.url,
        'x-embertally': 'web',
        'content-type': 'application/json',
        cookie: '__Host-sid=canary-cookie',
        authorization: 'Bearer canary-bearer',
      },
      body: JSON.stringify({ email: 'a@b.example', password: canary }),
    });
    expect(answer.status).toBe(401);
    const ended = once(server.process, 'exit');
    server.process.disconnect();
    await ended;
    expect(server.output()).toContain('/api/sessions');
    expect(server.output()).not.toMatch(/canary/);
    await server.stop();
  }, 60_000);
});
