import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import type { SiteRoleName } from '@embertally/shared/policy/policy';
import { supplierDraft } from '../../support/sample-drafts.ts';
import { samplePdf } from '../../support/sample-files.ts';
import { box, crate, groundFloor, uid, withEntries, withRoom } from '../../support/survey-builder.ts';
import { PASSWORD, TestApp, creating, type TestBook, type TestPerson } from '../../support/test-app.ts';
import type { Visitor } from '../../support/visitor.ts';

type Who = 'everyone' | 'signed in' | 'own organisation' | readonly SiteRoleName[];
const ALL: readonly SiteRoleName[] = ['manager', 'inspector', 'reviewer', 'viewer'];

/**
 * Who may do what, written down a second time from the product's own table, so that neither the policy nor a route can
 * drift alone. `keeper`: only in the organisation that keeps the site. `own organisation`: the one that made the thing.
 */
const EXPECTED: Readonly<Record<string, { readonly who: Who; readonly keeper?: true }>> = {
  'health.live': { who: 'everyone' },
  'health.ready': { who: 'everyone' },
  'cautions.list': { who: 'everyone' },
  'openapi.read': { who: 'everyone' },
  'docs.read': { who: 'everyone' },
  'organisations.create': { who: 'everyone' },
  'sessions.create': { who: 'everyone' },
  'sessions.read-current': { who: 'signed in' },
  'sessions.delete-current': { who: 'signed in' },
  'people.edit-current': { who: 'signed in' },
  'sites.list': { who: 'signed in' },
  'sites.create': { who: 'signed in' },
  'estimates.create': { who: 'signed in' },
  'materials.list': { who: 'signed in' },
  'kinds.list': { who: 'signed in' },
  'linings.list': { who: 'signed in' },
  'uses.list': { who: 'signed in' },
  'files.create': { who: 'signed in' },
  'files.read': { who: 'own organisation' },
  'own-materials.list': { who: 'signed in' },
  'own-materials.create': { who: 'signed in' },
  'own-materials.read': { who: 'own organisation' },
  'own-material-versions.create': { who: 'own organisation' },
  'own-material-versions.read': { who: 'own organisation' },
  'own-material-versions.edit': { who: 'own organisation' },
  'own-material-versions.discard': { who: 'own organisation' },
  'own-material-versions.move': { who: 'own organisation' },
  'sites.read': { who: ALL },
  'sites.edit': { who: ['manager'], keeper: true },
  'site-roles.give': { who: ['manager'], keeper: true },
  'site-roles.take': { who: ['manager'], keeper: true },
  'history.read': { who: ALL },
  'buildings.create': { who: ['manager', 'inspector'] },
  'buildings.read': { who: ALL },
  'buildings.edit': { who: ['manager', 'inspector'] },
  'limits.list': { who: ALL },
  'limits.create': { who: ['manager', 'inspector', 'reviewer'] },
  'limits.edit': { who: ['manager', 'inspector', 'reviewer'] },
  'limits.delete': { who: ['manager', 'inspector', 'reviewer'] },
  'surveys.read': { who: ALL },
  'surveys.read-document': { who: ALL },
  'surveys.read-changes': { who: ALL },
  'surveys.read-events': { who: ALL },
  'room-summaries.list': { who: ALL },
  'change-sets.create': { who: ['manager', 'inspector'] },
  'exports.create': { who: ALL },
  'exports.read': { who: ALL },
  'exports.stop': { who: ALL },
  'exports.read-file': { who: ALL },
};

interface Operation {
  readonly id: string;
  readonly method: 'get' | 'post' | 'patch' | 'put' | 'delete';
  readonly path: string;
  readonly status: number;
}

interface Persona {
  readonly name: string;
  readonly person: TestPerson | null;
  readonly role: SiteRoleName | null;
  readonly ofKeeper: boolean;
}

let app: TestApp;
let book: TestBook;
let keeper: TestPerson;
let inspector: TestPerson;
let exportId: string;
let fileId: string;
let operations: readonly Operation[];
let personas: readonly Persona[];
const TRAIL = { requestId: 'test', ip: '127.0.0.1' };

beforeAll(async () => {
  app = await TestApp.open({ makeReport: () => Promise.resolve(new TextEncoder().encode('%PDF-1.7')) });
  keeper = await app.person('Keeper');
  book = await app.book(keeper);
  const drawn = withEntries(
    withRoom(groundFloor({ id: book.storeyId }), 'dock', box(0, 0, 6, 4), { storey_id: book.storeyId }),
    crate('crate', 'dock', 2, 2),
  );
  await app.change(keeper, book.surveyId, creating(drawn, [book.storeyId]));
  personas = await makePersonas();
  inspector = personas.find((persona) => persona.name === 'inspector elsewhere')?.person ?? keeper;
  exportId = await makeExport();
  fileId = randomUUID();
  await keeper.visitor
    .send('post', uploadPath(fileId))
    .set('Content-Type', 'application/pdf')
    .send(samplePdf())
    .expect(201);
  const described = await app.visitor().get('/api/openapi.json').expect(200);
  operations = operationsOf(described.body as Described);
});
afterAll(() => app.close());

async function makePersonas(): Promise<Persona[]> {
  const made: Persona[] = [
    { name: 'nobody signed in', person: null, role: null, ofKeeper: false },
    { name: 'a stranger', person: await app.person('Stranger', 'Elsewhere'), role: null, ofKeeper: false },
    { name: 'a colleague without a role', person: await app.colleague(keeper), role: null, ofKeeper: true },
  ];
  for (const role of ALL) {
    const own = await app.colleague(keeper);
    const other = await app.person(`${role} elsewhere`, 'Harbour Office');
    for (const person of [own, other]) await app.give(keeper, book.siteId, person, role);
    made.push({ name: `${role} of the keeper`, person: own, role, ofKeeper: true });
    made.push({ name: `${role} elsewhere`, person: other, role, ofKeeper: false });
  }
  return made;
}

async function makeExport(): Promise<string> {
  const id = randomUUID();
  const access = await app.house.services.access.find(keeper, 'survey', book.surveyId);
  if (access === null) throw new Error('the keeper reaches the survey');
  await app.house.services.exports.create(
    keeper,
    access,
    book.surveyId,
    { id, kind: 'survey-report', room_id: null, units: 'SI' },
    TRAIL,
  );
  await vi.waitFor(async () => expect((await app.house.services.exports.read(id)).state).toBe('ready'), {
    timeout: 20_000,
  });
  return id;
}

const uploadPath = (id: string): string => `/api/files?id=${id}&name=report.pdf`;

interface Described {
  paths: Record<string, Record<string, { operationId: string; responses: Record<string, unknown> }>>;
}

function operationsOf({ paths }: Described): Operation[] {
  return Object.entries(paths).flatMap(([path, methods]) =>
    Object.entries(methods).map(([method, { operationId, responses }]) => ({
      id: operationId,
      method: method as Operation['method'],
      path,
      status: Number(Object.keys(responses).find((code) => code.startsWith('2'))),
    })),
  );
}

async function newLimit(): Promise<string> {
  const id = randomUUID();
  const access = await app.house.services.access.find(inspector, 'building', book.buildingId);
  if (access === null) throw new Error('the inspector reaches the building');
  const values = {
    quantity: 'peak_kW',
    bound: 900,
    source: 'house-rule',
    set_by: 'house rule 3',
    since: '2030-01-01',
  } as const;
  await app.house.services.limits.create(
    inspector,
    access,
    book.buildingId,
    { id, room_id: uid('dock'), ...values },
    TRAIL,
  );
  return id;
}

/** A draft of a member of the keeper: of the person asking, where they are one. */
async function newMaterial(who: Persona): Promise<Record<string, string>> {
  const id = randomUUID();
  const by = who.ofKeeper && who.person !== null ? who.person : keeper;
  await app.house.services.ownMaterials.create(by, { id, draft: supplierDraft(), evidence: [] }, TRAIL);
  return { materialId: id, version: '1' };
}

/** A request of each operation that would succeed for somebody who may make it. */
async function validRequest(
  id: string,
  who: Persona,
): Promise<{ params?: Record<string, string>; query?: string; body?: object; file?: Buffer; etag?: string }> {
  switch (id) {
    case 'organisations.create':
      return {
        body: {
          id: randomUUID(),
          organisation_name: 'Dune Works',
          name: 'Ivo',
          email: `${randomUUID()}@dune.example`,
          password: PASSWORD,
        },
      };
    case 'sessions.create':
      return { body: { email: keeper.email, password: PASSWORD } };
    case 'people.edit-current':
      return { body: { units: 'US' } };
    case 'sites.create':
      return { body: { id: randomUUID(), name: 'Own', address: '', time_zone: 'UTC' } };
    case 'sites.edit': {
      const site = await app.house.services.sites.read(keeper, book.siteId);
      return { body: { address: 'New' }, etag: `"v${site.version}"` };
    }
    case 'site-roles.give':
      return { body: { id: randomUUID(), email: (await app.person()).email, role: 'viewer' } };
    case 'site-roles.take':
      return { params: { roleId: await app.give(keeper, book.siteId, await app.person(), 'viewer') } };
    case 'buildings.create':
      return {
        body: {
          id: randomUUID(),
          survey_id: randomUUID(),
          storey_id: randomUUID(),
          name: 'Annex',
          storey_name: 'Ground',
        },
      };
    case 'buildings.edit': {
      const access = await app.house.services.access.find(keeper, 'building', book.buildingId);
      if (access === null) throw new Error('the keeper reaches the building');
      const { version } = await app.house.services.buildings.read(access, book.buildingId);
      return { body: { name: 'Store' }, etag: `"v${version}"` };
    }
    case 'limits.create':
      return {
        body: {
          id: randomUUID(),
          room_id: uid('dock'),
          quantity: 'peak_kW',
          bound: 5,
          source: 'house-rule',
          set_by: 'us',
          since: '2030-01-01',
        },
      };
    case 'limits.edit':
      return { params: { limitId: await newLimit() }, body: { bound: 7 }, etag: '"v1"' };
    case 'limits.delete':
      return { params: { limitId: await newLimit() }, etag: '"v1"' };
    case 'change-sets.create':
      return {
        body: {
          id: randomUUID(),
          label: 'note',
          changes: [{ kind: 'entry', id: uid('crate'), before: { note: '' }, after: { note: '' } }],
        },
      };
    case 'surveys.read-changes':
      return { query: '?after=0' };
    case 'estimates.create':
      return {
        body: {
          room: {
            name: 'r',
            ring_m: [
              [0, 0],
              [4, 0],
              [4, 3],
              [0, 3],
            ],
            height_m: 3,
          },
          contents: [],
        },
      };
    case 'own-materials.create':
      return { body: { id: randomUUID(), draft: supplierDraft(), evidence: [] } };
    case 'own-materials.read':
    case 'own-material-versions.read':
      return { params: await newMaterial(who) };
    case 'own-material-versions.create': {
      const params = await newMaterial(who);
      await app.owner.query("UPDATE own_material_version SET state = 'put-forward' WHERE material_id = $1", [
        params['materialId'],
      ]);
      await app.owner.query("UPDATE own_material_version SET state = 'returned' WHERE material_id = $1", [
        params['materialId'],
      ]);
      return { params, body: { id: randomUUID(), draft: supplierDraft(), evidence: [] } };
    }
    case 'own-material-versions.edit':
      return { params: await newMaterial(who), body: { draft: supplierDraft(), evidence: [] }, etag: '"v1"' };
    case 'own-material-versions.discard':
      return { params: await newMaterial(who), etag: '"v1"' };
    case 'own-material-versions.move':
      return { params: await newMaterial(who), body: { state: 'put-forward' }, etag: '"v1"' };
    case 'files.create':
      return { query: uploadPath(randomUUID()).replace('/api/files', ''), file: samplePdf() };
    case 'exports.create':
      return { body: { id: randomUUID(), kind: 'survey-report', room_id: null, units: 'SI' } };
    default:
      return {};
  }
}

async function statusOf(
  operation: Operation,
  visitor: Visitor,
  who: Persona,
  ids: Readonly<Record<string, string>>,
): Promise<{ status: number; body: unknown }> {
  const valid = await validRequest(operation.id, who);
  const all: Record<string, string> = { ...valid.params, ...ids };
  const path =
    operation.path.replace(/\{(\w+)\}/g, (_match, name: string) => all[name] ?? randomUUID()) + (valid.query ?? '');
  if (operation.id === 'surveys.read-events') {
    const stop = new AbortController();
    const answer = await fetch(app.url + path, { headers: { cookie: visitor.cookieHeader() }, signal: stop.signal });
    const body: unknown = answer.status === 200 ? null : await answer.json();
    stop.abort();
    return { status: answer.status, body };
  }
  const test = visitor.send(operation.method, path, valid.body);
  if (valid.etag !== undefined) test.set('If-Match', valid.etag);
  if (valid.file !== undefined) test.set('Content-Type', 'application/pdf').send(valid.file);
  const answer = await test;
  return { status: answer.status, body: answer.body };
}

const realIds = (): Record<string, string> => ({
  siteId: book.siteId,
  buildingId: book.buildingId,
  surveyId: book.surveyId,
  exportId,
  fileId,
});

function allowed({ who, keeper: keeperOnly }: { who: Who; keeper?: true }, persona: Persona): number | 'ok' {
  if (who === 'everyone') return 'ok';
  if (persona.person === null) return 401;
  if (who === 'signed in') return 'ok';
  if (who === 'own organisation') return persona.ofKeeper ? 'ok' : 404;
  if (persona.role === null) return 404;
  return who.includes(persona.role) && (keeperOnly !== true || persona.ofKeeper) ? 'ok' : 403;
}

/** The persona's browser; one of its own for the operations that begin or end a session. */
async function browserOf(persona: Persona, operationId = ''): Promise<Visitor> {
  if (persona.person === null) return app.visitor();
  if (!operationId.startsWith('sessions.')) return persona.person.visitor;
  return (await app.signedIn(persona.person.email)).visitor;
}

function persona(name: string): Persona {
  const found = personas.find((one) => one.name === name);
  if (found === undefined) throw new Error(`nobody is called ${name}`);
  return found;
}

/** Everything but who signed in when and what was refused. */
async function contentHash(): Promise<string> {
  const tables = [
    'organisation',
    'site',
    'site_role',
    'building',
    'survey',
    'storey',
    'corner',
    'room',
    'opening',
    'entry',
    'room_limit',
    'change_set',
    'export',
    'stored_file',
    'own_material',
    'own_material_version',
  ];
  const parts = tables.map(
    (table) => `(SELECT coalesce(md5(string_agg(t::text, ',' ORDER BY t::text)), '') FROM "${table}" t)`,
  );
  const found = await app.owner.query<{ hash: string }>(`SELECT ${parts.join(" || '/' || ")} AS hash`);
  return found.rows[0]?.hash ?? '';
}

describe('who may do what', () => {
  it('has a line for every operation of the API and no other', () => {
    expect(operations.map((operation) => operation.id).sort()).toEqual(Object.keys(EXPECTED).sort());
  });

  it('lets every persona do exactly what the table says, and nobody anything else', async () => {
    const wrong: string[] = [];
    for (const operation of operations) {
      const line = EXPECTED[operation.id];
      if (line === undefined) continue;
      for (const who of personas) {
        const visitor = await browserOf(who, operation.id);
        const expected = allowed(line, who);
        await app.owner.query("UPDATE export SET state = 'stopped' WHERE state IN ('waiting', 'running')");
        const { status } = await statusOf(operation, visitor, who, realIds());
        const right = expected === 'ok' ? operation.status : expected;
        if (status !== right) wrong.push(`${operation.id} as ${who.name}: ${status} instead of ${right}`);
      }
    }
    expect(wrong).toEqual([]);
  }, 180_000);

  it('tells a stranger nothing: an id of somebody else reads like one that does not exist', async () => {
    const stranger = await browserOf(persona('a stranger'));
    for (const operation of operations.filter((one) => one.path.includes('{'))) {
      const random = {
        siteId: randomUUID(),
        buildingId: randomUUID(),
        surveyId: randomUUID(),
        exportId: randomUUID(),
        limitId: randomUUID(),
        fileId: randomUUID(),
        materialId: randomUUID(),
      };
      const there = await statusOf(operation, stranger, persona('a stranger'), realIds());
      const nowhere = await statusOf(operation, stranger, persona('a stranger'), random);
      const bare = ({ status, body }: { status: number; body: unknown }): object => ({
        status,
        body: { ...(body as object), instance: '', requestId: '' },
      });
      expect(bare(there), operation.id).toEqual(bare(nowhere));
      expect(there.status, operation.id).toBe(404);
    }
  }, 60_000);

  it('changes nothing and writes down each refusal when a viewer tries to change things', async () => {
    const viewer = await browserOf(persona('viewer elsewhere'));
    const refusals = async (): Promise<number> => {
      const found = await app.owner.query<{ count: number }>(
        "SELECT count(*)::int AS count FROM audit_event WHERE chain_id = $1 AND record::json->>'action' = 'access.refused'",
        [book.siteId],
      );
      return found.rows[0]?.count ?? 0;
    };
    const limitId = await newLimit();
    const base = `/api/surveys/${book.surveyId}/change-sets`;
    const before = [await contentHash(), await refusals()] as const;
    const change = { kind: 'entry', id: uid('crate'), before: { note: '' }, after: { note: 'mine' } };
    await viewer.post(base, { id: randomUUID(), label: 'x', changes: [change] }).expect(403);
    await viewer.patch(`/api/sites/${book.siteId}`, { name: 'Mine' }, '"v1"').expect(403);
    await viewer.patch(`/api/limits/${limitId}`, { bound: 1 }, '"v1"').expect(403);
    await viewer.delete(`/api/limits/${limitId}`, '"v1"').expect(403);
    await viewer.patch(`/api/buildings/${book.buildingId}`, { name: 'Mine' }, '"v1"').expect(403);
    expect(await contentHash()).toBe(before[0]);
    expect(await refusals()).toBe(before[1] + 5);
  });

  it('takes effect at once when a role is lowered', async () => {
    const person = await app.person();
    await app.give(keeper, book.siteId, person, 'inspector');
    const change = { kind: 'entry', id: uid('crate'), before: { note: '' }, after: { note: '' } };
    const send = () =>
      person.visitor.post(`/api/surveys/${book.surveyId}/change-sets`, {
        id: randomUUID(),
        label: 'x',
        changes: [change],
      });
    await send().expect(201);
    await app.give(keeper, book.siteId, person, 'viewer');
    await send().expect(403);
  });

  it('shows a list of sites nothing of other people’s', async () => {
    const stranger = await app.person('Stranger', 'Elsewhere');
    await app.book(stranger);
    const list = await stranger.visitor.get('/api/sites?search=gull').expect(200);
    expect(JSON.stringify(list.body)).not.toContain(book.siteId);
    expect((list.body as { items: object[] }).items).toHaveLength(1);
  });
});
