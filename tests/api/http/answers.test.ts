import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { TestApp, type TestPerson } from '../../support/test-app.ts';

let app: TestApp;
let person: TestPerson;
beforeAll(async () => {
  app = await TestApp.open();
  person = await app.person();
});
afterAll(() => app.close());

const CSP =
  "default-src 'none';script-src 'self';style-src 'self';img-src 'self' blob: data:;font-src 'self';connect-src 'self';worker-src 'self';manifest-src 'self';base-uri 'none';object-src 'none';frame-ancestors 'none';form-action 'self'";

const UUID = '7d0bb8a4-3d9c-4b8c-9d0f-0d9f4f3b2a11';
const PATHS = [
  '/api/health/live',
  '/api/sites',
  '/api/sessions/current',
  '/api/cautions',
  '/api/materials',
  `/api/sites/${UUID}`,
  `/api/surveys/${UUID}/document`,
  '/api/nothing',
  '/api/docs',
  '/api/openapi.json',
  '/',
  '/assets/gone.js',
  '/api/sites?cursor=%00',
  '/%E0%A4%A',
];

describe('every answer', () => {
  it.each(PATHS)('of %s carries the headers, a type and a number', async (path) => {
    for (const visitor of [person.visitor, app.visitor()]) {
      const { headers, status } = await visitor.get(path);
      expect(status).toBeLessThan(500);
      expect(headers['content-security-policy']).toBe(CSP);
      expect(headers).toMatchObject({
        'x-content-type-options': 'nosniff',
        'x-frame-options': 'DENY',
        'referrer-policy': 'no-referrer',
        'cross-origin-opener-policy': 'same-origin',
        'cross-origin-resource-policy': 'same-origin',
        'strict-transport-security': 'max-age=63072000; includeSubDomains',
        'cache-control': expect.stringContaining('no-store') as string,
      });
      expect(headers['x-request-id']).toMatch(/^[0-9a-f-]{36}$/);
      expect(headers['content-type']).toMatch(/; charset=utf-8$/);
      expect(headers).not.toHaveProperty('x-powered-by');
      expect(headers).not.toHaveProperty('set-cookie');
    }
  });

  it('that is not 2xx is a problem with its parts', async () => {
    const answers = [
      await person.visitor.get('/api/nothing').expect(404),
      await app.visitor().get('/api/sites').expect(401),
      await person.visitor.post('/api/sites', { name: 5, extra: true }).expect(422),
      await person.visitor.bare('post', '/api/sites').expect(403),
      await person.visitor.post('/api/sites').set('Content-Type', 'application/json').send('{"id":').expect(400),
      await person.visitor.send('put', '/api/sites', {}).expect(405),
      await person.visitor.post('/api/sites').set('Content-Type', 'text/plain').send('x').expect(415),
      await person.visitor.post('/api/sites', { name: 'x'.repeat(70_000) }).expect(413),
      await person.visitor.get('/api/sites/%E0%A4%A').expect(400),
    ];
    for (const { body, headers, status } of answers) {
      expect(headers['content-type']).toBe('application/problem+json; charset=utf-8');
      expect(body).toMatchObject({
        type: expect.stringMatching(/^\/api\/docs#/) as string,
        title: expect.any(String) as string,
        status,
        detail: expect.stringMatching(/\w.*\.$/) as string,
        instance: expect.stringMatching(/^\//) as string,
        requestId: headers['x-request-id'],
      });
      expect(JSON.stringify(body)).not.toMatch(/node_modules|\.ts|SELECT|stack/);
    }
  });

  it('names every fault of a body, where it is', async () => {
    const answer = await person.visitor
      .post('/api/sites', { name: 5, address: 'x'.repeat(501), extra: true })
      .expect(422);
    expect((answer.body as { errors: object[] }).errors).toEqual(
      expect.arrayContaining([
        expect.objectContaining({ pointer: '/name', message: 'name must be text.' }),
        expect.objectContaining({ pointer: '/address', message: 'address must be at most 500 characters.' }),
        expect.objectContaining({ pointer: '/extra', code: 'UNKNOWN_FIELD' }),
        expect.objectContaining({ pointer: '/id', message: 'id is missing.' }),
        expect.objectContaining({ pointer: '/time_zone' }),
      ]),
    );
  });

  it('to a method a path does not take says which it takes', async () => {
    await person.visitor.send('delete', '/api/sites').expect(405).expect('Allow', 'GET, HEAD, POST');
    await app.visitor().send('put', '/api/cautions', {}).expect(405).expect('Allow', 'GET, HEAD');
  });

  it('is compressed when that is asked for', async () => {
    const read = (encoding: string) =>
      fetch(`${app.url}/api/materials`, {
        headers: { cookie: person.visitor.cookieHeader(), 'accept-encoding': encoding },
      });
    const plain = await read('identity');
    const small = await read('gzip');
    expect(plain.headers.get('content-encoding')).toBeNull();
    expect(small.headers.get('content-encoding')).toBe('gzip');
    expect(await small.text()).toBe(await plain.text());
  });
});

describe('reading', () => {
  it('changes no row anywhere', async () => {
    const book = await app.book(person);
    const hash = async (): Promise<string> => {
      const tables = await app.owner.query<{ name: string }>(
        "SELECT tablename AS name FROM pg_tables WHERE schemaname = 'public' ORDER BY 1",
      );
      let all = '';
      for (const { name } of tables.rows) {
        const found = await app.owner.query<{ hash: string }>(
          `SELECT coalesce(md5(string_agg(t::text, ',' ORDER BY t::text)), '') AS hash FROM "${name}" t`,
        );
        all += `${name} ${found.rows[0]?.hash ?? ''}\n`;
      }
      return all;
    };
    await app.house.services.summaries.settled();
    const before = await hash();
    const reads = [
      ...PATHS,
      `/api/sites/${book.siteId}`,
      `/api/sites/${book.siteId}/history`,
      `/api/buildings/${book.buildingId}`,
      `/api/buildings/${book.buildingId}/limits`,
      `/api/surveys/${book.surveyId}`,
      `/api/surveys/${book.surveyId}/document`,
      `/api/surveys/${book.surveyId}/changes?after=0`,
      `/api/surveys/${book.surveyId}/room-summaries`,
    ];
    for (const path of reads) {
      await person.visitor.get(path);
      await app.visitor().get(path);
    }
    expect(await hash()).toBe(before);
  });
});

describe('the description', () => {
  it('is OpenAPI 3.1 with a policy at every operation', async () => {
    const answer = await app.visitor().get('/api/openapi.json').expect(200);
    const described = answer.body as {
      openapi: string;
      paths: Record<string, Record<string, Record<string, unknown>>>;
    };
    expect(described.openapi).toBe('3.1.0');
    const operations = Object.values(described.paths).flatMap((methods) => Object.values(methods));
    expect(operations.length).toBeGreaterThan(30);
    for (const operation of operations) expect(operation['x-policy']).toHaveProperty('kind');
    expect(described.paths['/api/estimates']?.['post']?.['requestBody']).toBeDefined();
  });

  it('is also a page to read', async () => {
    const { text } = await app
      .visitor()
      .get('/api/docs')
      .expect(200)
      .expect('Content-Type', /text\/html/);
    expect(text).toContain('POST /api/surveys/:surveyId/change-sets');
  });
});
