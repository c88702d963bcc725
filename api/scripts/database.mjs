import { spawn } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { clusterFolder, ensureDatabase, ensurePostgres, serverUrl, startCluster, stopCluster } from './postgres.mjs';

/** Secrets are made once and stay in the data folder, readable by their owner only. */
function secrets(dataFolder) {
  mkdirSync(dataFolder, { recursive: true });
  const file = join(dataFolder, 'secrets.json');
  if (!existsSync(file)) {
    const made = {
      ownerPassword: randomBytes(24).toString('base64url'),
      appPassword: randomBytes(24).toString('base64url'),
    };
    writeFileSync(file, `${JSON.stringify(made, null, 2)}\n`, { mode: 0o600 });
  }
  return JSON.parse(readFileSync(file, 'utf8'));
}

/** A private cluster on loopback, or the server of DATABASE_URL. Says how to reach it and how to stop what was started. */
export async function database(root, dataFolder) {
  if (process.env.DATABASE_URL) {
    const url = process.env.DATABASE_URL;
    return {
      env: { DATABASE_URL: url, MIGRATION_DATABASE_URL: process.env.MIGRATION_DATABASE_URL ?? url },
      ours: false,
      stop: () => {},
    };
  }
  ensurePostgres();
  const folder = clusterFolder(dataFolder);
  const keeper = join(dataFolder, 'cluster-keeper');
  // Written before the cluster is touched: the guard of a command that was killed lets go of it at once.
  const ours = !isAlive(keeper);
  if (ours) keep(root, keeper, folder);
  const cluster = await startCluster({ folder, passwordFile: join(dataFolder, 'postgres-password') });
  const { ownerPassword, appPassword } = secrets(dataFolder);
  await ensureDatabase({ ...cluster, database: 'embertally', ownerPassword, appPassword });
  return {
    env: {
      DATABASE_URL: serverUrl('embertally_app', appPassword, cluster.port, 'embertally'),
      MIGRATION_DATABASE_URL: serverUrl('embertally_owner', ownerPassword, cluster.port, 'embertally'),
    },
    ours: true,
    stop: ours ? () => stopCluster(cluster.folder) : () => {},
  };
}

/** Whether the start command that keeps the running cluster still lives; one that was killed leaves it to the next. */
function isAlive(keeper) {
  if (!existsSync(keeper)) return false;
  try {
    process.kill(Number(readFileSync(keeper, 'utf8')), 0);
    return true;
  } catch (error) {
    return error.code === 'EPERM';
  }
}

/**
 * Takes the cluster into this command's keeping and makes sure it is stopped even when the command is killed: the guard's
 * input ends with us, however we end. It stops nothing that a later command has taken over by then.
 */
function keep(root, keeper, folder) {
  mkdirSync(dirname(keeper), { recursive: true });
  writeFileSync(keeper, String(process.pid));
  spawn(process.execPath, [join(root, 'api', 'scripts', 'cluster-guard.mjs'), folder, keeper, String(process.pid)], {
    stdio: ['pipe', 'ignore', 'ignore'],
    detached: true,
  }).unref();
}
