import { spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, readdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { asStop, say } from './say.mjs';

function filesOf(folder) {
  return readdirSync(folder, { withFileTypes: true })
    .sort((a, b) => (a.name < b.name ? -1 : 1))
    .flatMap((item) => {
      const path = join(folder, item.name);
      if (item.isDirectory()) return item.name === 'node_modules' || item.name === 'dist' ? [] : filesOf(path);
      return [path];
    });
}

/** Builds the web client when a source file, the build's settings or the packages changed since the last build. */
export async function buildWebWhenStale(root) {
  const hash = createHash('sha256');
  for (const file of [
    ...filesOf(join(root, 'web')),
    ...filesOf(join(root, 'shared', 'src')),
    join(root, 'package-lock.json'),
  ]) {
    hash.update(file.slice(root.length)).update(readFileSync(file));
  }
  const wanted = hash.digest('hex');
  const stamp = join(root, 'web', 'dist', '.stamp');
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return;
  say('Building the web client…');
  const { code, output } = await runNode(
    root,
    [
      join(root, 'node_modules', 'vite', 'bin', 'vite.js'),
      'build',
      'web',
      '--config',
      join(root, 'web', 'vite.config.ts'),
      '--logLevel',
      'warn',
    ],
    { NODE_ENV: 'production' },
  );
  if (code !== 0) throw asStop(new Error(output), 'Building the web client');
  writeFileSync(stamp, wanted);
}

function runNode(root, args, env) {
  return new Promise((done) => {
    const child = spawn(process.execPath, args, {
      cwd: root,
      env: { ...process.env, ...env },
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    let output = '';
    child.stdout.on('data', (chunk) => (output += chunk));
    child.stderr.on('data', (chunk) => (output += chunk));
    child.on('exit', (code) => done({ code, output }));
  });
}
