import { createServer } from 'node:http';
import { pino } from 'pino';
import { seedDemo } from '../scripts/seed.ts';
import { systemClock } from './clock.ts';
import { EnvError, readEnv, type Env } from './env.ts';
import { House } from './house.ts';
import { migrate } from './migrate.ts';

/** After this the process goes even when a request still hangs, ms. */
const LAST_ms = 20_000;
/** Connections made before the word to stop are still served; no longer than this is waited for their requests, ms. */
const DRAIN_ms = 400;

function settings(): Env | null {
  try {
    return readEnv(process.env);
  } catch (error) {
    if (!(error instanceof EnvError)) throw error;
    process.stderr.write(`${error.message}\n`);
    process.exitCode = 1;
    return null;
  }
}

async function main(env: Env): Promise<void> {
  const log = pino({ level: env.logLevel });
  if (env.migrationDatabaseUrl !== null) await migrate(env.migrationDatabaseUrl);
  const house = new House(env, log);
  await house.open();
  if (env.demo) {
    await seedDemo({ services: house.services, database: house.database, clock: systemClock, dataDir: env.dataDir });
  }
  const server = createServer(house.app);
  // A file of 25 MB from a tablet at 1 Mbit/s takes 200 s.
  server.requestTimeout = 300_000;
  server.headersTimeout = 15_000;

  let stopping = false;
  server.prependListener('request', (_request, response) => {
    if (stopping) response.shouldKeepAlive = false;
  });
  const end = (): void => {
    house.close().then(
      () => process.exit(0),
      (error: unknown) => {
        log.error({ err: error }, 'stopping');
        process.exit(1);
      },
    );
  };
  // Told more than once (a key press reaches starter and server alike) it goes on stopping.
  const stop = (): void => {
    if (stopping) return;
    stopping = true;
    setTimeout(() => process.exit(1), LAST_ms).unref();
    house.endStreams();
    setTimeout(() => {
      house.endStreams();
      server.close(end);
      server.closeIdleConnections();
    }, DRAIN_ms);
  };
  process.on('SIGTERM', stop);
  process.on('SIGINT', stop);
  process.on('disconnect', stop);

  await new Promise<void>((done, failed) => {
    server.once('error', failed);
    server.listen(env.port, env.host, done);
  });
  log.info({ address: env.baseUrl.href }, 'listening');
  process.send?.('ready');
}

const env = settings();
if (env !== null) {
  main(env).catch((error: unknown) => {
    process.stderr.write(`Embertally could not start: ${error instanceof Error ? error.message : String(error)}\n`);
    process.exit(1);
  });
}
