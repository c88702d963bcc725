import { randomUUID } from 'node:crypto';
import { request as httpRequest } from 'node:http';
import { mkdirSync, readdirSync, rmdirSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { StoredFile } from '@embertally/shared/contracts/files';
import { sampleCsv, sampleJpeg, samplePdf, samplePng } from '../../support/sample-files.ts';
import { TestApp, type TestPerson } from '../../support/test-app.ts';

const MB = 1024 * 1024;
let app: TestApp;
let person: TestPerson;
let colleague: TestPerson;
beforeAll(async () => {
  app = await TestApp.open({ env: { FILES_PER_ORGANISATION_MB: '40' } });
  person = await app.person('Mara Quill');
  colleague = await app.colleague(person);
});
afterAll(() => app.close());

const path = (name = 'report.pdf', id: string = randomUUID()): string =>
  `/api/files?id=${id}&name=${encodeURIComponent(name)}`;
const send = (who: TestPerson, to: string, type: string, content: Buffer) =>
  who.visitor.send('post', to).set('Content-Type', type).send(content);
const stored = (): string[] => readdirSync(app.filesFolder);
const rows = async (): Promise<number> =>
  (await app.owner.query<{ count: number }>('SELECT count(*)::int AS count FROM stored_file')).rows[0]?.count ?? 0;

describe('a file', () => {
  it.each([
    ['application/pdf', samplePdf()],
    ['image/png', samplePng()],
    ['image/jpeg', sampleJpeg()],
    ['text/csv', sampleCsv()],
    ['text/csv; charset=utf-8', sampleCsv()],
  ])('of %s comes back as it was sent, to be saved and never opened', async (type, content) => {
    const sent = await send(person, path('Prüf/bericht "1".x'), type, content).expect(201);
    const file = sent.body as StoredFile;
    expect(file).toMatchObject({ bytes: content.length, name: 'Prüf/bericht "1".x', sent_by: 'Mara Quill' });
    const back = await colleague.visitor
      .get(`/api/files/${file.id}`)
      .buffer(true)
      .parse((response, done) => {
        const pieces: Buffer[] = [];
        response.on('data', (piece: Buffer) => pieces.push(piece));
        response.on('end', () => done(null, Buffer.concat(pieces)));
      })
      .expect(200);
    expect((back.body as Buffer).equals(content)).toBe(true);
    expect(back.headers).toMatchObject({
      'content-disposition': `attachment; filename="Pr-f-bericht-1-.x"; filename*=UTF-8''Pr%C3%BCf%2Fbericht%20%221%22.x`,
      'content-security-policy': "sandbox; default-src 'none'",
      'x-content-type-options': 'nosniff',
      'cross-origin-resource-policy': 'same-origin',
      'cache-control': 'private, no-cache',
      etag: `"${file.sha256}"`,
    });
    expect(back.headers['content-type']).toContain(type.split(';')[0]);
    await colleague.visitor.get(`/api/files/${file.id}`).set('If-None-Match', `"${file.sha256}"`).expect(304);
  });

  it('is not there for anybody else, and reads like one that never was', async () => {
    const { id } = (await send(person, path(), 'application/pdf', samplePdf()).expect(201)).body as StoredFile;
    const stranger = await app.person('Stranger', 'Elsewhere');
    const there = await stranger.visitor.get(`/api/files/${id}`).expect(404);
    const nowhere = await stranger.visitor.get(`/api/files/${randomUUID()}`).expect(404);
    const bare = (body: object): object => ({ ...body, instance: '', requestId: '' });
    expect(bare(there.body as object)).toEqual(bare(nowhere.body as object));
    await app.visitor().get(`/api/files/${id}`).expect(401);
  });

  it('sent twice with one id is kept once; another content with that id is refused', async () => {
    const to = path('sheet.pdf');
    const first = await send(person, to, 'application/pdf', samplePdf()).expect(201);
    const again = await Promise.all([1, 2, 3].map(() => send(person, to, 'application/pdf', samplePdf()).expect(201)));
    for (const { body } of again) expect(body).toEqual(first.body);
    await send(person, to, 'application/pdf', samplePdf('another')).expect(409);
    await send(colleague, to, 'application/pdf', samplePdf()).expect(409);
    const both = path('race.pdf');
    const race = await Promise.all(
      ['one', 'two'].map((text) => send(person, both, 'application/pdf', samplePdf(text))),
    );
    expect(race.map(({ status }) => status).sort()).toEqual([201, 409]);
    const won = race.find(({ status }) => status === 201)?.body as StoredFile;
    const back = await person.visitor.get(`/api/files/${won.id}`).buffer(true).expect(200);
    expect((back.body as Buffer).length).toBe(won.bytes);
  });
});

describe('what is no file of ours', () => {
  it.each([
    ['a page called a picture', 'image/png', Buffer.from('<html></html>'), 415],
    [
      'a script behind a JPEG head',
      'image/jpeg',
      Buffer.concat([Buffer.from([0xff, 0xd8, 0xff, 0xe0]), Buffer.from('<script>')]),
      415,
    ],
    ['a picture called a report', 'application/pdf', samplePng(), 415],
    ['a drawing', 'image/svg+xml', Buffer.from('<svg/>'), 415],
    ['a page', 'text/html', Buffer.from('<html></html>'), 415],
    ['a table that is a page', 'text/csv', Buffer.from('<html></html>'), 415],
    ['JSON', 'application/json', Buffer.from('{}'), 415],
    ['a form', 'multipart/form-data; boundary=x', Buffer.from('--x--'), 415],
    ['nothing', 'application/pdf', Buffer.alloc(0), 422],
    ['a picture of 196 million points', 'image/png', samplePng(14_000, 14_000), 415],
    ['a table of 26 MB', 'text/csv', Buffer.alloc(26 * MB, 'a;b\n'), 413],
  ])('%s is refused and leaves nothing', async (_name, type, content, status) => {
    const before = [stored().length, await rows()];
    const answer = await send(person, path(), type, content).expect(status);
    expect(answer.body).toMatchObject({ detail: expect.stringMatching(/nothing was kept|is empty/i) as string });
    expect([stored().length, await rows()]).toEqual(before);
  });

  it.each([
    ['without a name', '/api/files?id=7d0bb8a4-3d9c-4b8c-9d0f-0d9f4f3b2a11'],
    ['without an id', '/api/files?name=x.pdf'],
    ['with an id that is a path', '/api/files?id=..%2F..%2Fx&name=x.pdf'],
    ['with a NUL in its name', '/api/files?id=7d0bb8a4-3d9c-4b8c-9d0f-0d9f4f3b2a11&name=a%00b.pdf'],
    ['with a name without end', `/api/files?id=7d0bb8a4-3d9c-4b8c-9d0f-0d9f4f3b2a11&name=${'x'.repeat(201)}`],
    ['with a field nobody knows', '/api/files?id=7d0bb8a4-3d9c-4b8c-9d0f-0d9f4f3b2a11&name=x&path=y'],
  ])('%s is refused', async (_name, to) => {
    await send(person, to, 'application/pdf', samplePdf()).expect(422);
  });

  it('is taken with a path as its name, which only people read', async () => {
    const sent = await send(person, path('../../etc/passwd'), 'application/pdf', samplePdf()).expect(201);
    expect(stored()).toContain(`file-${(sent.body as StoredFile).id}`);
  });

  it('does not get in from another page', async () => {
    await person.visitor.bare('post', path()).set('Content-Type', 'application/pdf').send(samplePdf()).expect(403);
    await send(person, path(), 'application/pdf', samplePdf()).set('Origin', 'https://evil.example').expect(403);
  });
});

/** Sends a head and some bytes the way no browser does; gives the status, or null when the connection only closed. */
function rawUpload(
  headers: Record<string, string>,
  write: (piece: (content: Buffer) => boolean, end: () => void, cut: () => void) => void,
): Promise<number | null> {
  return new Promise((done) => {
    const sent = httpRequest(app.url + path(), {
      method: 'POST',
      headers: {
        cookie: person.visitor.cookieHeader(),
        origin: app.url,
        'x-embertally': 'web',
        'content-type': 'text/csv',
        ...headers,
      },
    });
    sent.on('response', (response) => {
      response.resume();
      done(response.statusCode ?? null);
    });
    sent.on('error', () => done(null));
    write(
      (content) => sent.write(content),
      () => sent.end(),
      () => sent.destroy(),
    );
  });
}

describe('an upload', () => {
  it('without a length is taken up to the limit and refused beyond it', async () => {
    const few = await rawUpload({ 'transfer-encoding': 'chunked' }, (piece, end) => {
      piece(sampleCsv());
      end();
    });
    expect(few).toBe(201);
    const before = stored().length;
    const many = await rawUpload({ 'transfer-encoding': 'chunked' }, (piece, end) => {
      for (let sent = 0; sent < 27; sent += 1) piece(Buffer.alloc(MB, '1;2\n'));
      end();
    });
    expect(many).toBe(413);
    expect(stored()).toHaveLength(before);
  });

  it('that breaks off leaves nothing', async () => {
    const before = [stored().length, await rows()];
    const status = await rawUpload({ 'content-length': '1000' }, (piece, _end, cut) => {
      piece(sampleCsv());
      setImmediate(cut);
    });
    expect(status).toBeNull();
    await expect.poll(() => stored().length).toBe(before[0]);
    expect(await rows()).toBe(before[1]);
  });

  it('ends where the organisation has used up its room; another has its own', async () => {
    const big = (): Buffer => Buffer.alloc(24 * MB, 'a;b\n');
    const one = await send(person, path('one.csv'), 'text/csv', big()).expect(201);
    const files = stored().length;
    const full = await send(person, path('two.csv'), 'text/csv', big()).expect(507);
    expect(full.body).toMatchObject({ detail: expect.stringContaining('40 MB') as string });
    expect(stored()).toHaveLength(files);
    const other = await app.person('Stranger', 'Elsewhere');
    await send(other, path('three.csv'), 'text/csv', big()).expect(201);
    // The same one again needs no more room.
    const { id } = one.body as StoredFile;
    await send(person, path('one.csv', id), 'text/csv', big()).expect(201);
  });
});

describe('a file that could not get its name', () => {
  it('is not there, and is when it is sent again', async () => {
    const id = randomUUID();
    mkdirSync(join(app.filesFolder, `file-${id}`));
    await send(person, path('report.pdf', id), 'application/pdf', samplePdf()).expect(500);
    await person.visitor.get(`/api/files/${id}`).expect(404);
    expect(stored().filter((name) => name.endsWith('.part'))).toEqual([]);
    rmdirSync(join(app.filesFolder, `file-${id}`));
    await send(person, path('report.pdf', id), 'application/pdf', samplePdf()).expect(201);
    await person.visitor.get(`/api/files/${id}`).expect(200);
  });
});

describe('files that nothing refers to', () => {
  it('stay while somebody is about to refer to them', async () => {
    const { id } = (await send(person, path(), 'application/pdf', samplePdf()).expect(201)).body as StoredFile;
    await app.owner.query(`UPDATE stored_file SET created_at = created_at - interval '2 days' WHERE id = $1`, [id]);
    const attaching = await app.owner.connect();
    await attaching.query('BEGIN');
    await attaching.query('SELECT 1 FROM stored_file WHERE id = $1 FOR SHARE', [id]);
    await app.house.services.files.sweep();
    await person.visitor.get(`/api/files/${id}`).expect(200);
    await attaching.query('COMMIT');
    attaching.release();
    await app.house.services.files.sweep();
    await person.visitor.get(`/api/files/${id}`).expect(404);
  });

  it('go a day after they came, and what never arrived after an hour; the rest stays', async () => {
    const { files } = app.house.services;
    const sweep = () => files.sweep();
    const old = (await send(person, path(), 'application/pdf', samplePdf()).expect(201)).body as StoredFile;
    const placed = (await send(person, path(), 'image/png', samplePng()).expect(201)).body as StoredFile;
    const never = (await send(person, path(), 'application/pdf', samplePdf()).expect(201)).body as StoredFile;
    await app.owner.query(`UPDATE stored_file SET state = 'arriving' WHERE id = $1`, [never.id]);
    const book = await app.book(person);
    await app.owner.query('UPDATE storey SET plan_picture = $1 WHERE survey_id = $2', [
      { file_id: placed.id },
      book.surveyId,
    ]);
    app.clock.forward(2);
    await sweep();
    expect(stored()).not.toContain(`file-${never.id}`);
    expect(stored()).toContain(`file-${old.id}`);
    app.clock.forward(23);
    await sweep();
    expect(stored()).not.toContain(`file-${old.id}`);
    expect(stored()).toContain(`file-${placed.id}`);
    const left = await app.owner.query<{ id: string }>('SELECT id FROM stored_file');
    expect(left.rows.map(({ id }) => id)).toEqual([placed.id]);
  });
});
