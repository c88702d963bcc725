import { spawn } from 'node:child_process';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { buildWebWhenStale } from './build-web-when-stale.mjs';
import { checkNode, ensurePackages } from './packages.mjs';
import { ensurePostgres } from './postgres.mjs';
import { command } from './say.mjs';

const root = join(dirname(fileURLToPath(import.meta.url)), '..', '..');

/** `npm run bench [-- --json FILE]`: the speeds we hold ourselves to, measured on this machine. */
await command(async () => {
  checkNode();
  ensurePackages(root);
  ensurePostgres();
  await buildWebWhenStale(root);
  const child = spawn(
    process.execPath,
    ['--import', 'tsx', join(root, 'tests', 'bench', 'run-bench.ts'), ...process.argv.slice(2)],
    {
      cwd: process.cwd(),
      env: { ...process.env, NODE_ENV: 'production', TSX_TSCONFIG_PATH: join(root, 'api', 'tsconfig.json') },
      stdio: 'inherit',
    },
  );
  process.exitCode = await new Promise((done) => child.on('exit', (code) => done(code ?? 1)));
});
