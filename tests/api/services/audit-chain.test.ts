import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { AuditRepository, type AuditChainKey } from '../../../api/src/repositories/audit-repository.ts';
import { recordEvent } from '../../../api/src/services/audit-record.ts';
import { verifyAuditChain } from '../../../api/src/services/verify-audit-chain.ts';
import { TestApp } from '../../support/test-app.ts';

let app: TestApp;
beforeAll(async () => {
  app = await TestApp.open();
});
afterAll(() => app.close());

const TRAIL = { requestId: 'test', ip: '127.0.0.1' };
const audit = (): AuditRepository => new AuditRepository(app.house.database.statements);

async function add(chain: AuditChainKey, text: string): Promise<void> {
  await recordEvent(app.house.database.statements, {
    chain,
    actor: null,
    action: 'test.done',
    object: { kind: 'test', id: text },
    trail: TRAIL,
    at: app.clock.now(),
  });
}

async function filled(events: number): Promise<AuditChainKey> {
  const chain: AuditChainKey = { kind: 'site', id: randomUUID() };
  for (let event = 0; event < events; event += 1) await add(chain, `event ${event}`);
  return chain;
}

/** Tampers as somebody with the database's own keys could: past the trigger. */
async function tamper(statement: string, values: unknown[]): Promise<void> {
  const client = await app.owner.connect();
  try {
    await client.query('ALTER TABLE audit_event DISABLE TRIGGER ALL').catch(async () => {
      await client.query('ALTER TABLE audit_event DISABLE TRIGGER USER');
    });
    await client.query(statement, values);
    await client.query('ALTER TABLE audit_event ENABLE TRIGGER USER');
  } finally {
    client.release();
  }
}

describe('a chain of audit events', () => {
  it('verifies from the first event to the head', async () => {
    const chain = await filled(25);
    const { rows, head } = await audit().chain(chain);
    expect(verifyAuditChain(rows, head)).toEqual({ whole: true, events: 25 });
  });

  it('has no gap when many add at once', async () => {
    const chain: AuditChainKey = { kind: 'organisation', id: randomUUID() };
    await Promise.all(Array.from({ length: 30 }, (_, event) => add(chain, `event ${event}`)));
    const { rows, head } = await audit().chain(chain);
    expect(verifyAuditChain(rows, head)).toEqual({ whole: true, events: 30 });
  });

  it('points at an edited row', async () => {
    const chain = await filled(9);
    await tamper('UPDATE audit_event SET record = $2 WHERE chain_id = $1 AND position = 4', [
      chain.id,
      '{"action":"other"}',
    ]);
    const { rows, head } = await audit().chain(chain);
    expect(verifyAuditChain(rows, head)).toEqual({ whole: false, brokenAt: 4 });
  });

  it.each([
    ['a row taken out of the middle', 'DELETE FROM audit_event WHERE chain_id = $1 AND position = 4', 4],
    ['the last rows cut off', 'DELETE FROM audit_event WHERE chain_id = $1 AND position > 6', 7],
  ])('points at %s', async (_name, statement, brokenAt) => {
    const chain = await filled(9);
    await tamper(statement, [chain.id]);
    const { rows, head } = await audit().chain(chain);
    expect(verifyAuditChain(rows, head)).toEqual({ whole: false, brokenAt });
  });

  it('keeps each record on one line whatever was typed', async () => {
    const chain: AuditChainKey = { kind: 'site', id: randomUUID() };
    await add(chain, 'first\r\nsecond\u001b[31m red');
    const { rows } = await audit().chain(chain);
    for (const sign of ['\r', '\n', '\u001b']) expect(rows[0]?.record).not.toContain(sign);
  });
});

describe('what is written down', () => {
  it('covers signing in and out, refusals, roles, buildings and limits, with who, when, from where and which request', async () => {
    const manager = await app.person('Mara Quill');
    const book = await app.book(manager);
    const viewer = await app.person('Vic Lade', 'Elsewhere');
    const roleId = await app.give(manager, book.siteId, viewer, 'viewer');
    const refused = await viewer.visitor.patch(`/api/sites/${book.siteId}`, { name: 'x' }, '"v1"').expect(403);
    await manager.visitor.delete(`/api/sites/${book.siteId}/roles/${roleId}`).expect(204);
    await app.visitor().post('/api/sessions', { email: manager.email, password: 'wrong words altogether' }).expect(401);
    await manager.visitor.delete('/api/sessions/current').expect(204);

    const records = async (chain: AuditChainKey): Promise<Record<string, unknown>[]> => {
      const { rows, head } = await audit().chain(chain);
      expect(verifyAuditChain(rows, head).whole).toBe(true);
      return rows.map((row) => JSON.parse(row.record) as Record<string, unknown>);
    };
    const onSite = await records({ kind: 'site', id: book.siteId });
    expect(onSite.map((record) => record['action'])).toEqual([
      'site.made',
      'building.made',
      'site-role.given',
      'access.refused',
      'site-role.taken',
    ]);
    expect(onSite[3]).toMatchObject({
      by: { person_id: viewer.personId, organisation_id: viewer.organisationId },
      facts: { wanted: 'site.edit', role: 'viewer' },
      request_id: (refused.body as { requestId: string }).requestId,
      ip: expect.stringMatching(/127\.0\.0\.1$/) as string,
      at: expect.stringMatching(/Z$/) as string,
    });
    const inOrganisation = await records({ kind: 'organisation', id: manager.organisationId });
    expect(inOrganisation.map((record) => record['action'])).toEqual([
      'organisation.made',
      'session.begun',
      'session.refused',
      'session.ended',
    ]);
    const text = JSON.stringify([onSite, inOrganisation]);
    expect(text).not.toContain('wrong words');
    expect(text).not.toContain(manager.visitor.cookies.get('__Host-sid') ?? 'no cookie');
  });

  it('is read by people of the site without network addresses and request numbers', async () => {
    const manager = await app.person();
    const book = await app.book(manager);
    const history = await manager.visitor.get(`/api/sites/${book.siteId}/history?limit=1`).expect(200);
    expect(history.body).toMatchObject({
      items: [{ position: 2, action: 'building.made', by: { name: manager.name } }],
      next_before: 2,
    });
    expect(history.text).not.toContain('127.0.0.1');
    const rest = await manager.visitor.get(`/api/sites/${book.siteId}/history?before=2`).expect(200);
    expect(rest.body).toMatchObject({ items: [{ position: 1, action: 'site.made' }], next_before: null });
  });
});
