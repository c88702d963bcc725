import { spawn } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { buildWebWhenStale } from './build-web-when-stale.mjs';
import { database } from './database.mjs';
import { checkNode, ensurePackages } from './packages.mjs';
import { Stop, command, say } from './say.mjs';

const root = join(dirname(fileURLToPath(import.meta.url)), '..', '..');
const dataFolder = process.env.DATA_DIR ?? join(root, '.data');

function port() {
  const wanted = process.env.PORT ?? '3000';
  const number = Number(wanted);
  if (!/^\d+$/.test(wanted) || number < 1 || number > 65_535)
    throw new Stop(`PORT must be a number from 1 to 65535; it is "${wanted}".`);
  return number;
}

async function checkPortFree(number, host) {
  const server = createServer();
  await new Promise((done, failed) => {
    server.once('error', (error) =>
      failed(
        new Stop(
          error.code === 'EADDRINUSE'
            ? `Port ${number} is taken, perhaps by Embertally already running. Stop that program, or choose another port: PORT=${number + 1} npm start.`
            : `Port ${number} on ${host} cannot be opened (${error.code}). Choose another with PORT=… npm start.`,
        ),
      ),
    );
    server.listen(number, host, done);
  });
  await new Promise((done) => server.close(done));
}

function printDemo() {
  const file = join(dataFolder, 'demo.json');
  if (!existsSync(file)) return;
  const { people } = JSON.parse(readFileSync(file, 'utf8'));
  say('\nDemo book: sign in as one of these people (invented, on this machine only)');
  for (const person of people)
    say(
      `  ${person.role.padEnd(10)} ${person.email.padEnd(38)} ${person.password}   ${person.name}, ${person.organisation}`,
    );
}

async function main() {
  checkNode();
  const listenOn = port();
  const host = process.env.HOST ?? '127.0.0.1';
  await checkPortFree(listenOn, host);
  ensurePackages(root);
  await buildWebWhenStale(root);
  const server = await database(root, dataFolder);
  const demo = process.env.DEMO ?? (server.ours ? '1' : '0');
  const address = process.env.BASE_URL ?? `http://127.0.0.1:${listenOn}`;

  const api = spawn(process.execPath, ['--import', 'tsx', 'src/index.ts'], {
    cwd: join(root, 'api'),
    env: {
      NODE_ENV: 'production',
      ...process.env,
      ...server.env,
      PORT: String(listenOn),
      HOST: host,
      BASE_URL: address,
      DATA_DIR: dataFolder,
      DEMO: demo,
      WEB_DIST: join(root, 'web', 'dist'),
    },
    // The channel lets the server see that its starter is gone, even when the starter was killed.
    stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
  });
  let stopping = false;
  const stop = () => {
    if (stopping) return;
    stopping = true;
    say('\nStopping: requests under way are finished first…');
    api.kill('SIGTERM');
  };
  process.on('SIGINT', stop);
  process.on('SIGTERM', stop);
  api.on('message', (message) => {
    if (message !== 'ready') return;
    say(`\nEmbertally is at ${address}`);
    if (demo === '1') printDemo();
    say('\nCtrl-C stops it.');
  });
  const code = await new Promise((done) => api.on('exit', (exit) => done(exit ?? 1)));
  server.stop();
  process.exit(stopping ? 0 : code === 0 ? 0 : 1);
}

await command(main);
