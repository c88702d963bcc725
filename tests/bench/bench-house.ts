import { randomUUID } from 'node:crypto';
import { chmodSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { migrate } from '../../api/src/migrate.ts';
import { ensureDatabase, serverUrl, startCluster } from '../../api/scripts/postgres.mjs';
import { startServer, type RunningServer } from '../support/running-server.ts';

export interface BenchHouse {
  readonly server: RunningServer;
  readonly databaseUrl: string;
  /** A request as our pages send it, signed in. */
  readonly send: (method: string, path: string, body?: unknown) => Promise<Response>;
  readonly book: {
    readonly siteId: string;
    readonly buildingId: string;
    readonly surveyId: string;
    readonly storeyId: string;
  };
  readonly stop: () => Promise<void>;
}

const PASSWORD = 'bench lantern over the quay';

/** The real server on a private cluster that writes to the disk as in production, with one signed-in person and one book. */
export async function openBenchHouse(): Promise<BenchHouse> {
  const base = mkdtempSync(join(tmpdir(), 'embertally-bench-'));
  chmodSync(base, 0o755);
  const cluster = await startCluster({ folder: join(base, 'postgres'), passwordFile: join(base, 'password') });
  const secret = randomUUID();
  await ensureDatabase({ ...cluster, database: 'embertally', ownerPassword: secret, appPassword: secret });
  const ownerUrl = serverUrl('embertally_owner', secret, cluster.port, 'embertally');
  const appUrl = serverUrl('embertally_app', secret, cluster.port, 'embertally');
  await migrate(ownerUrl);
  const server = await startServer({ ownerUrl, appUrl, drop: () => Promise.resolve() }, { LOG_LEVEL: 'error' });

  let cookie = '';
  const send = async (method: string, path: string, body?: unknown): Promise<Response> => {
    const answer = await fetch(server.url + path, {
      method,
      headers: {
        origin: server.url,
        'x-embertally': 'web',
        cookie,
        ...(body === undefined ? {} : { 'content-type': 'application/json' }),
      },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    });
    const set = answer.headers.getSetCookie().map((one) => one.split(';')[0] ?? '');
    if (set.length > 0) cookie = set.join('; ');
    if (!answer.ok) throw new Error(`${method} ${path}: ${answer.status} ${await answer.text()}`);
    return answer;
  };
  const book = { siteId: randomUUID(), buildingId: randomUUID(), surveyId: randomUUID(), storeyId: randomUUID() };
  const email = 'bench@quayside.example';
  await send('POST', '/api/organisations', {
    id: randomUUID(),
    organisation_name: 'Quayside Works',
    name: 'Bench',
    email,
    password: PASSWORD,
  });
  await send('POST', '/api/sessions', { email, password: PASSWORD });
  await send('POST', '/api/sites', { id: book.siteId, name: 'Bench', address: '', time_zone: 'Europe/London' });
  await send('POST', `/api/sites/${book.siteId}/buildings`, {
    id: book.buildingId,
    survey_id: book.surveyId,
    storey_id: book.storeyId,
    name: 'Store',
    storey_name: 'Ground floor',
  });
  return {
    server,
    databaseUrl: appUrl,
    send,
    book,
    stop: async () => {
      await server.stop();
      cluster.stop();
      rmSync(base, { recursive: true, force: true });
    },
  };
}
