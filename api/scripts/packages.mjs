import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { Stop, asStop, say } from './say.mjs';

const OLDEST_NODE = [20, 19];

export function checkNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major < OLDEST_NODE[0] || (major === OLDEST_NODE[0] && minor < OLDEST_NODE[1])) {
    throw new Stop(
      `Embertally needs Node ${OLDEST_NODE.join('.')} or newer; this is ${process.versions.node}. Install a newer Node and run the command again.`,
    );
  }
}

/** npm writes its own record of what it installed: one as new as the lock file means somebody ran npm themselves. */
function installedByHand(root) {
  const record = join(root, 'node_modules', '.package-lock.json');
  return existsSync(record) && statSync(record).mtimeMs >= statSync(join(root, 'package-lock.json')).mtimeMs;
}

/** Installs the npm packages of the lock file when they are not the ones already there. */
export function ensurePackages(root) {
  const lock = readFileSync(join(root, 'package-lock.json'));
  const wanted = createHash('sha256').update(lock).update(process.versions.node).digest('hex');
  const stamp = join(root, 'node_modules', '.embertally-stamp');
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === wanted) return;
  if (!existsSync(stamp) && installedByHand(root)) {
    writeFileSync(stamp, wanted);
    return;
  }
  say('Installing npm packages…');
  // What npm sets for a workspace run or a production install would leave half of the packages out.
  const env = Object.fromEntries(
    Object.entries(process.env).filter(
      ([name]) => !/^npm_config_(workspace|omit|include)/i.test(name) && name !== 'NODE_ENV',
    ),
  );
  const done = spawnSync('npm', ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'], {
    cwd: root,
    env,
    encoding: 'utf8',
    stdio: ['ignore', 'inherit', 'pipe'],
  });
  if (done.status !== 0) throw asStop(new Error(done.stderr || String(done.error ?? '')), 'Installing npm packages');
  writeFileSync(stamp, wanted);
}
