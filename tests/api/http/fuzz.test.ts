import { randomUUID } from 'node:crypto';
import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { compositionDraft, formulaDraft, supplierDraft } from '../../support/sample-drafts.ts';
import { TestApp, type TestBook, type TestPerson } from '../../support/test-app.ts';

let app: TestApp;
let person: TestPerson;
let book: TestBook;
let materialId: string;
let operations: readonly { method: 'get' | 'post' | 'patch' | 'put' | 'delete'; path: string }[];

beforeAll(async () => {
  app = await TestApp.open();
  person = await app.person();
  book = await app.book(person);
  materialId = randomUUID();
  await person.visitor.post('/api/own-materials', { id: materialId, draft: supplierDraft(), evidence: [] }).expect(201);
  const answer = await app.visitor().get('/api/openapi.json').expect(200);
  operations = Object.entries((answer.body as { paths: Record<string, object> }).paths).flatMap(([path, methods]) =>
    Object.keys(methods)
      .filter(() => !/events|sessions\/current|file$/.test(path))
      .map((method) => ({ method: method as 'get', path })),
  );
});
afterAll(() => app.close());

const encoded = (text: string): string => encodeURIComponent(text.replace(/\p{Surrogate}/gu, '?'));

const odd = fc.oneof(
  fc.constantFrom<unknown>(
    null,
    '',
    '\0',
    '\ud800',
    '__proto__',
    -1,
    0,
    1e308,
    Number.MAX_SAFE_INTEGER,
    [],
    {},
    [[]],
    true,
    "'; drop table person; --",
    '%',
    '_',
    '../../etc/passwd',
    'x'.repeat(5000),
    '٣',
    '𝟙',
    '2030-02-30',
    '0x10',
    JSON.parse('{"__proto__": {"role": "admin"}, "constructor": 1}') as object,
  ),
  fc.jsonValue({ maxDepth: 4 }),
  fc.string({ unit: 'binary', maxLength: 60 }),
  fc.uuid(),
);
const body = fc.oneof(
  odd,
  fc.dictionary(
    fc.constantFrom(
      'id',
      'name',
      'changes',
      'label',
      'email',
      'password',
      'bound',
      'room',
      'contents',
      'role',
      'version',
      'kind',
      'room_id',
      'draft',
      'evidence',
      'state',
      'reason',
    ),
    odd,
    { maxKeys: 6 },
  ),
  fc.record({
    id: fc.uuid(),
    label: fc.string(),
    changes: fc.array(
      fc.record({
        kind: fc.constantFrom('entry', 'room', 'corner', 'opening', 'storey', 'x'),
        id: fc.uuid(),
        before: odd,
        after: odd,
      }),
      { maxLength: 4 },
    ),
  }),
);
const material = fc.record({
  id: fc.uuid(),
  draft: fc.oneof(
    odd,
    fc
      .tuple(
        fc.constantFrom(supplierDraft(), formulaDraft(), compositionDraft([])),
        fc.constantFrom(
          'label',
          'way',
          'curve',
          'parts',
          'formula',
          'heat_MJ',
          'range',
          'accepted',
          'moisture',
          'elements',
        ),
        odd,
      )
      .map(([draft, name, value]) => ({ ...draft, [name]: value })),
  ),
  evidence: fc.oneof(fc.constant([]), fc.array(fc.uuid(), { maxLength: 3 }), odd),
});
const query = fc.oneof(
  fc.constant(''),
  fc
    .tuple(
      fc.constantFrom('after', 'limit', 'cursor', 'search', 'before', 'workings', 'sort', '__proto__'),
      fc.string({ unit: 'binary', maxLength: 30 }),
    )
    .map(([name, value]) => `?${name}=${encoded(value)}`),
  fc.constantFrom('?after=0&after=1', '?limit[]=1', '?cursor[a]=1', '?after=%00', '?limit=1e9', '?search=%25_%27'),
);

describe('whatever is sent', () => {
  it('never makes the server fail, hang or die: 2,000 odd requests', async () => {
    const ids: Record<string, string> = {
      siteId: book.siteId,
      buildingId: book.buildingId,
      surveyId: book.surveyId,
      materialId,
      version: '1',
    };
    await fc.assert(
      fc.asyncProperty(
        fc.nat(),
        fc.oneof(body, body, material),
        query,
        fc.boolean(),
        fc.oneof(fc.constant(null), odd),
        async (which, sent, asked, own, id) => {
          const operation = operations[which % operations.length];
          if (operation === undefined) return;
          const text = typeof id === 'string' ? encoded(id.slice(0, 300)) || 'x' : 'nothing';
          const path = operation.path.replace(
            /\{(\w+)\}/g,
            (_match, name: string) => (own ? ids[name] : undefined) ?? text,
          );
          const test = person.visitor.send(operation.method, path + asked).set('If-Match', own ? '"v1"' : 'W/"v1"');
          const from = performance.now();
          const answer =
            operation.method === 'get' || operation.method === 'delete'
              ? await test
              : await test.set('Content-Type', 'application/json').send(JSON.stringify(sent));
          const what = `${operation.method} ${path}${asked} ${JSON.stringify(sent)}`;
          expect(answer.status, what).toBeLessThan(500);
          expect(performance.now() - from, what).toBeLessThan(5000);
          if (answer.status >= 400) expect(answer.headers['content-type'], what).toContain('application/problem+json');
        },
      ),
      { numRuns: 2000, seed: 20300131 },
    );
    await app.visitor().get('/api/health/ready').expect(200);
  }, 180_000);
});
