import { spawn } from 'node:child_process';
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { installDebian } from './debian.mjs';
import { checkNode, ensurePackages } from './packages.mjs';
import { ensurePostgres } from './postgres.mjs';
import { command, say } from './say.mjs';

const root = join(dirname(fileURLToPath(import.meta.url)), '..', '..');
const bin = (name) => join(root, 'node_modules', '.bin', name);

/** Debian packages the tests look through: a browser to use the product and tools to look at its PDF pages. */
function ensureTools() {
  const missing = [];
  if (!existsSync('/usr/bin/chromium')) missing.push('chromium');
  if (!existsSync('/usr/bin/pdftoppm')) missing.push('poppler-utils');
  if (missing.length > 0) installDebian(missing, `the test tools (${missing.join(', ')})`);
  if (!process.env.DATABASE_URL) ensurePostgres();
}

function run(tool, args, env = {}) {
  return new Promise((done) => {
    const child = spawn(tool, args, { cwd: root, env: { ...process.env, ...env }, stdio: 'inherit' });
    child.on('exit', (code) => done(code ?? 1));
  });
}

/** A check that is one yes or no: types, lint, build. */
async function check(name, steps) {
  say(`\n── ${name}`);
  for (const [tool, args] of steps) {
    if ((await run(tool, args)) !== 0) return { name, passed: 0, failed: 1, skipped: 0 };
  }
  return { name, passed: 1, failed: 0, skipped: 0 };
}

async function vitest(name, projects) {
  say(`\n── ${name}`);
  const folder = join(root, '.data', 'test');
  mkdirSync(folder, { recursive: true });
  const file = join(folder, `${name}.json`);
  rmSync(file, { force: true });
  const code = await run(
    bin('vitest'),
    [
      'run',
      ...projects.flatMap((project) => ['--project', project]),
      '--reporter=default',
      '--reporter=json',
      `--outputFile=${file}`,
    ],
    { NODE_ENV: 'test' },
  );
  if (!existsSync(file)) return { name, passed: 0, failed: 1, skipped: 0 };
  const report = JSON.parse(readFileSync(file, 'utf8'));
  const failed = report.numFailedTests;
  // A file that could not even be loaded, or an error outside a test, fails the run without failing a test.
  const outside = code !== 0 && failed === 0 ? Math.max(1, report.numFailedTestSuites ?? 0) : 0;
  return {
    name,
    passed: report.numPassedTests,
    failed: failed + outside,
    skipped: report.numPendingTests + (report.numTodoTests ?? 0),
  };
}

async function main() {
  checkNode();
  ensurePackages(root);
  ensureTools();
  const began = performance.now();
  const results = [
    await check(
      'types',
      ['.', 'shared', 'api', 'web', 'tests'].map((workspace) => [bin('tsc'), ['-p', workspace]]),
    ),
    await check('lint', [
      [bin('eslint'), ['.', '--max-warnings', '0']],
      [bin('prettier'), ['--check', '--log-level', 'warn', '.']],
    ]),
    await vitest('unit', ['unit', 'web']),
    await check('build', [[process.execPath, [join(root, 'api', 'scripts', 'build-web.mjs')]]]),
    await vitest('api', ['api']),
    await vitest('e2e', ['e2e']),
  ];
  const total = (key) => results.reduce((sum, result) => sum + result[key], 0);
  say(
    `\n${results.map((r) => `${r.name.padEnd(8)} ${r.passed} passed, ${r.failed} failed, ${r.skipped} skipped`).join('\n')}`,
  );
  say(`in ${((performance.now() - began) / 60_000).toFixed(1)} min`);
  say(`${total('passed')} passed, ${total('failed')} failed, ${total('skipped')} skipped`);
  process.exit(total('failed') === 0 ? 0 : 1);
}

await command(main);
