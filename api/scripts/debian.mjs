import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, writeFileSync } from 'node:fs';
import { Stop, asStop, say } from './say.mjs';

const isRoot = () => process.getuid?.() === 0;

/**
 * Installs Debian packages. Without the right to do so it stops with the command a person with the right can run.
 * @param {string[]} packages
 * @param {string} what what the packages are for, as a person would say it
 */
export function installDebian(packages, what) {
  const byHand = `apt-get install -y --no-install-recommends ${packages.join(' ')}`;
  if (!existsSync('/usr/bin/apt-get')) {
    throw new Stop(
      `${what} is not installed and this is not Debian: install ${packages.join(', ')} with your system's own tools, then run the command again.`,
    );
  }
  if (!isRoot()) {
    throw new Stop(
      `${what} is not installed and this user may not install it. Run "sudo ${byHand}" once, then run the command again.`,
    );
  }
  if (packages.includes('postgresql')) {
    // Debian's package would start a server of its own on the usual port; ours is private.
    mkdirSync('/etc/postgresql-common', { recursive: true });
    if (!existsSync('/etc/postgresql-common/createcluster.conf')) {
      writeFileSync('/etc/postgresql-common/createcluster.conf', 'create_main_cluster = false\n');
    }
  }
  say(`Installing ${what}…`);
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  for (const args of [
    ['update', '-q'],
    ['install', '-yq', '--no-install-recommends', '-o', 'Dpkg::Options::=--force-confold', ...packages],
  ]) {
    const done = spawnSync('apt-get', args, { env, encoding: 'utf8' });
    if (done.status !== 0) throw asStop(new Error(`${done.stdout}\n${done.stderr}`), `Installing ${what}`);
  }
}
