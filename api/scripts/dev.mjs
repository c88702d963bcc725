import { spawn } from 'node:child_process';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { database } from './database.mjs';
import { checkNode, ensurePackages } from './packages.mjs';
import { command, say } from './say.mjs';

const root = join(dirname(fileURLToPath(import.meta.url)), '..', '..');
const dataFolder = process.env.DATA_DIR ?? join(root, '.data');
const API_PORT = '3001';
const WEB_PORT = '5173';

/** The API restarted on every change, and Vite in front of it with the client's sources as they are. */
async function main() {
  checkNode();
  ensurePackages(root);
  const server = await database(root, dataFolder);
  const env = {
    ...process.env,
    ...server.env,
    NODE_ENV: 'development',
    PORT: API_PORT,
    BASE_URL: `http://127.0.0.1:${WEB_PORT}`,
    API_URL: `http://127.0.0.1:${API_PORT}`,
    DATA_DIR: dataFolder,
    DEMO: process.env.DEMO ?? (server.ours ? '1' : '0'),
  };
  const children = [
    spawn(process.execPath, ['--watch', '--import', 'tsx', 'src/index.ts'], {
      cwd: join(root, 'api'),
      env,
      stdio: 'inherit',
    }),
    spawn(
      process.execPath,
      [
        join(root, 'node_modules', 'vite', 'bin', 'vite.js'),
        'web',
        '--config',
        join(root, 'web', 'vite.config.ts'),
        '--host',
        '127.0.0.1',
        '--port',
        WEB_PORT,
        '--strictPort',
      ],
      { cwd: root, env, stdio: 'inherit' },
    ),
  ];
  say(`\nOpen http://127.0.0.1:${WEB_PORT}`);
  const stop = () => children.forEach((child) => child.kill('SIGTERM'));
  process.on('SIGINT', stop);
  process.on('SIGTERM', stop);
  await Promise.all(children.map((child) => new Promise((done) => child.on('exit', done))));
  server.stop();
}

await command(main);
