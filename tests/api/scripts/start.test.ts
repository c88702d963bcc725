import { spawn, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { chmodSync, existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { clusterFolder } from '../../../api/scripts/postgres.mjs';
import { root } from '../../support/import-graph.ts';

interface Started {
  readonly child: ChildProcess;
  readonly output: () => string;
  /** Resolves with the address once it is printed; rejects with the output when the command ends before. */
  readonly ready: Promise<string>;
  readonly ended: Promise<number | null>;
}

// The test runner sets a BASE_URL of its own; a person's shell has neither that nor a server of theirs here.
const { BASE_URL: _base, DATABASE_URL: _database, ...outside } = process.env;
const READY_MS = 120_000;

function start(env: Readonly<Record<string, string>>): Started {
  const child = spawn(process.execPath, [join(root, 'api', 'scripts', 'start.mjs')], {
    cwd: root,
    env: { ...outside, NODE_ENV: 'production', LOG_LEVEL: 'silent', ...env },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let output = '';
  const ended = once(child, 'exit').then(([code]) => code as number | null);
  const ready = new Promise<string>((found, failed) => {
    const look = (chunk: Buffer): void => {
      output += chunk.toString();
      const address = /Embertally is at (\S+)/.exec(output)?.[1];
      if (address !== undefined) found(address);
    };
    child.stdout?.on('data', look);
    child.stderr?.on('data', look);
    void ended.then((code) => failed(new Error(`ended with ${code}:\n${output}`)));
    setTimeout(() => failed(new Error(`not ready in time:\n${output}`)), READY_MS).unref();
  });
  ready.catch(() => undefined);
  return { child, output: () => output, ready, ended };
}

async function freePort(): Promise<string> {
  const server = createServer().listen(0, '127.0.0.1');
  await once(server, 'listening');
  const address = server.address();
  server.close();
  await once(server, 'close');
  return String(address === null || typeof address === 'string' ? 0 : address.port);
}

describe('npm start', () => {
  const data = mkdtempSync(join(tmpdir(), 'embertally-start-'));
  chmodSync(data, 0o755);
  afterAll(() => rmSync(data, { recursive: true, force: true }));

  it.each([
    ['a port that is no number', { PORT: 'tea' }, /PORT must be a number/],
    ['a port out of range', { PORT: '70000' }, /PORT must be a number/],
  ])('ends with one sentence for %s', async (_what, env, sentence) => {
    const { ended, output } = start({ ...env, DATA_DIR: data });
    expect(await ended).toBe(1);
    expect(output().trim().split('\n')).toHaveLength(1);
    expect(output()).toMatch(sentence);
  });

  it('ends with one sentence when the port is taken, and says how to choose another', async () => {
    const other = createServer().listen(0, '127.0.0.1');
    await once(other, 'listening');
    const port = String((other.address() as { port: number }).port);
    const { ended, output } = start({ PORT: port, DATA_DIR: data });
    expect(await ended).toBe(1);
    expect(output()).toContain(`Port ${port} is taken`);
    expect(output()).toContain('PORT=');
    other.close();
  });

  it(
    'serves from nothing with the demo book, stops all it started, and keeps the data',
    { timeout: 300_000 },
    async () => {
      const port = await freePort();
      const env = { PORT: port, DATA_DIR: data };
      const first = start(env);
      const address = await first.ready;
      expect((await fetch(`${address}/api/health/ready`)).status).toBe(200);
      expect(await (await fetch(address)).text()).toContain('<div id="root">');
      await expect.poll(first.output).toMatch(/inspector\s+\S+@\S+\s+\S+/);
      const demo = readFileSync(join(data, 'demo.json'), 'utf8');
      first.child.kill('SIGTERM');
      expect(await first.ended).toBe(0);
      const pidFile = join(clusterFolder(data), 'postmaster.pid');
      expect(existsSync(pidFile)).toBe(false);

      // The next start is cut down without warning, database and all; the one after brings it back.
      const second = start(env);
      await second.ready;
      const postmaster = Number(readFileSync(pidFile, 'utf8').split('\n')[0]);
      process.kill(postmaster, 'SIGKILL');
      second.child.kill('SIGKILL');
      await second.ended;
      await expect
        .poll(
          () =>
            fetch(`${address}/api/health/live`).then(
              () => 'up',
              () => 'down',
            ),
          { timeout: 30_000 },
        )
        .toBe('down');

      const third = start(env);
      await third.ready;
      expect(third.output()).toContain('The database had been killed; bringing it back from its log.');
      expect(readFileSync(join(data, 'demo.json'), 'utf8')).toBe(demo);
      const person = (JSON.parse(demo) as { people: { email: string; password: string }[] }).people[0]!;
      const answer = await fetch(`${address}/api/sessions`, {
        method: 'POST',
        headers: { 'content-type': 'application/json', 'x-embertally': 'web', origin: address },
        body: JSON.stringify({ email: person.email, password: person.password }),
      });
      expect(answer.status).toBe(201);
      third.child.kill('SIGINT');
      expect(await third.ended).toBe(0);
      expect(existsSync(pidFile)).toBe(false);
    },
  );
});
