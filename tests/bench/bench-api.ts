import { randomUUID } from 'node:crypto';
import { once } from 'node:events';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { promisify } from 'node:util';
import { gzip } from 'node:zlib';
import pg from 'pg';
import { openBenchHouse, type BenchHouse } from './bench-house.ts';
import { benchDocument } from './bench-document.ts';
import { atMost, median, type BenchRow } from './bench-row.ts';

const ROUNDS = 9;
const PER_ROUND = 20;
const pack = promisify(gzip);

async function milliseconds(work: () => Promise<unknown>): Promise<number> {
  const began = performance.now();
  await work();
  return performance.now() - began;
}

/** Medians of the ratio of two ways, measured one after the other in every round. */
async function ratio(
  ours: () => Promise<unknown>,
  bare: () => Promise<unknown>,
): Promise<{ ratio: number; ours_ms: number }> {
  const ratios: number[] = [];
  const times: number[] = [];
  for (let round = 0; round < ROUNDS; round += 1) {
    const a: number[] = [];
    const b: number[] = [];
    for (let turn = 0; turn < PER_ROUND; turn += 1) {
      a.push(await milliseconds(ours));
      b.push(await milliseconds(bare));
    }
    ratios.push(median(a) / median(b));
    times.push(median(a));
  }
  return { ratio: median(ratios), ours_ms: median(times) };
}

/** The least a server can do: one prepared query for the same rows, JSON, gzip; one transaction for the same writes. */
async function bareServer(house: BenchHouse, entryId: string): Promise<{ url: string; stop: () => Promise<void> }> {
  const pool = new pg.Pool({ connectionString: house.databaseUrl, max: 4 });
  const rows = async (kind: string): Promise<unknown[]> =>
    (
      await pool.query<Record<string, unknown>>({
        name: kind,
        text: `SELECT * FROM "${kind}" WHERE survey_id = $1 ORDER BY id`,
        values: [house.book.surveyId],
      })
    ).rows;
  const roomId = (await pool.query<{ room_id: string }>('SELECT room_id FROM entry WHERE id = $1', [entryId])).rows[0]
    ?.room_id;
  const personId = (await pool.query<{ id: string }>('SELECT id FROM person')).rows[0]?.id;
  let sequence = 1_000_000;
  const server = createServer((request, response) => {
    void (async () => {
      if (request.method === 'GET') {
        const [storeys, corners, rooms, openings, entries] = await Promise.all(
          ['storey', 'corner', 'room', 'opening', 'entry'].map(rows),
        );
        const body = await pack(JSON.stringify({ storeys, corners, rooms, openings, entries }));
        response.setHeader('content-encoding', 'gzip').setHeader('content-type', 'application/json').end(body);
        return;
      }
      const chunks: Buffer[] = [];
      for await (const chunk of request) chunks.push(chunk as Buffer);
      const sent = Buffer.concat(chunks).toString();
      sequence += 1;
      const client = await pool.connect();
      await client.query('BEGIN');
      await client.query('UPDATE entry SET count = count + 1, version = version + 1 WHERE survey_id = $1 AND id = $2', [
        house.book.surveyId,
        entryId,
      ]);
      await client.query(
        'INSERT INTO change_set (id, survey_id, sequence, label, body_hash, changes, person_id, at) VALUES ($1, $2, $3, $4, $5, $6, $7, now())',
        [randomUUID(), house.book.surveyId, sequence, 'bare', 'bare', sent, personId],
      );
      await client.query('UPDATE survey SET sequence = sequence WHERE id = $1', [house.book.surveyId]);
      await client.query('UPDATE room_summary SET stale = stale WHERE survey_id = $1 AND room_id = $2', [
        house.book.surveyId,
        roomId,
      ]);
      await client.query('COMMIT');
      client.release();
      response.end('{}');
    })();
  });
  server.listen(0, '127.0.0.1');
  await once(server, 'listening');
  return {
    url: `http://127.0.0.1:${(server.address() as AddressInfo).port}`,
    stop: async () => {
      server.closeAllConnections();
      server.close();
      await pool.end();
    },
  };
}

/** Document of 50 rooms and 2,000 entries: reading it whole, and changing one entry of it. */
export async function benchApi(): Promise<readonly BenchRow[]> {
  const house = await openBenchHouse();
  try {
    const { document, sets } = benchDocument(house.book, 50, 40);
    const path = `/api/surveys/${house.book.surveyId}`;
    for (const changes of sets)
      await house.send('POST', `${path}/change-sets`, { id: randomUUID(), label: 'bench', changes });
    const entry = [...document.entries.values()][0]!;
    const bare = await bareServer(house, entry.id);
    const read = await ratio(
      async () => (await house.send('GET', `${path}/document`)).arrayBuffer(),
      async () => (await fetch(bare.url)).arrayBuffer(),
    );
    let note = '';
    const change = await ratio(
      async () => {
        const next = `moved ${randomUUID()}`;
        const changes = [{ kind: 'entry', id: entry.id, before: { note }, after: { note: next } }];
        await (
          await house.send('POST', `${path}/change-sets`, { id: randomUUID(), label: 'bench', changes })
        ).arrayBuffer();
        note = next;
      },
      async () =>
        (
          await fetch(bare.url, {
            method: 'POST',
            body: JSON.stringify([{ kind: 'entry', id: entry.id, before: { note }, after: { note } }]),
          })
        ).arrayBuffer(),
    );
    await bare.stop();
    return [
      atMost('GET document, 50 rooms and 2,000 entries, over raw pg + http', read.ratio, '×', 1.3),
      atMost('  the same, time', read.ours_ms, 'ms', null),
      atMost('one-entry change set over a bare transaction of the same writes', change.ratio, '×', 3),
      atMost('  the same, time', change.ours_ms, 'ms', null),
    ];
  } finally {
    await house.stop();
  }
}
