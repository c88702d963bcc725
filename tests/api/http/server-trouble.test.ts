import { randomUUID } from 'node:crypto';
import { afterAll, afterEach, describe, expect, it, vi } from 'vitest';
import { Fault } from '../../../api/src/fault.ts';
import { serverTrouble } from '../../../api/src/http/server-trouble.ts';
import { DatabaseProxy } from '../../support/database-proxy.ts';
import { PASSWORD, TestApp } from '../../support/test-app.ts';
import { createTestDatabase, type TestDatabase } from '../../support/test-database.ts';

let database: TestDatabase | null = null;
let cable: DatabaseProxy | null = null;
let app: TestApp | null = null;

async function connected(pluggedIn: boolean): Promise<{ app: TestApp; cable: DatabaseProxy }> {
  database ??= await createTestDatabase();
  cable = await DatabaseProxy.to(database.appUrl);
  if (pluggedIn) await cable.plugIn();
  app = await TestApp.open({ database, databaseUrl: cable.url });
  return { app, cable };
}
afterEach(async () => {
  if (cable !== null) await cable.pullOut();
  await app?.close();
  [cable, app] = [null, null];
});
afterAll(async () => {
  await database?.drop();
});

describe('a database that goes away', () => {
  it('is said in a moment, with when to come back; and all is well as soon as it is there again', async () => {
    const { app, cable } = await connected(true);
    const person = await app.person();
    const book = await app.book(person);
    await person.visitor.get('/api/health/ready').expect(200);
    await cable.pullOut();
    for (const path of ['/api/health/ready', '/api/sites', `/api/surveys/${book.surveyId}/document`]) {
      const from = performance.now();
      const answer = await person.visitor.get(path).expect(503);
      expect(performance.now() - from).toBeLessThan(3000);
      expect(answer.headers['retry-after']).toBe('2');
      expect(answer.headers['content-type']).toContain('application/problem+json');
      expect(answer.text).not.toMatch(/ECONN|postgres|127\.0\.0\.1/);
    }
    await app.visitor().post('/api/sessions', { email: person.email, password: PASSWORD }).expect(503);
    await person.visitor.get('/api/health/live').expect(200);
    await cable.plugIn();
    await vi.waitFor(() => person.visitor.get('/api/health/ready').expect(200), { timeout: 2000 });
    await person.visitor.get('/api/sites').expect(200);
  });

  it('at the start is waited for: the process answers 503 and then works, events included', async () => {
    const { app, cable } = await connected(false);
    await app.visitor().get('/api/health/live').expect(200);
    await app.visitor().get('/api/health/ready').expect(503);
    await app.visitor().post('/api/sessions', { email: 'a@b.example', password: 'x' }).expect(503);
    await cable.plugIn();
    await vi.waitFor(() => app.visitor().get('/api/health/ready').expect(200), { timeout: 8000, interval: 100 });
    const person = await app.person();
    await person.visitor.post('/api/sites', { id: randomUUID(), name: 'A', address: '', time_zone: 'UTC' }).expect(201);
  });

  it('for idle connections only is not noticed by anybody', async () => {
    const { app } = await connected(true);
    const person = await app.person();
    await person.visitor.get('/api/sites').expect(200);
    await app.owner.query('SELECT 1');
    await app.house.database.statements
      .query(
        "SELECT pg_terminate_backend(pid) FROM pg_stat_activity WHERE application_name LIKE 'embertally%' AND pid <> pg_backend_pid() AND datname = current_database()",
      )
      .catch((error: unknown) => {
        throw error;
      });
    await vi.waitFor(() => person.visitor.get('/api/sites').expect(200), { timeout: 2000 });
  });
});

describe('an error of the database', () => {
  it.each([
    [{ code: 'ECONNREFUSED' }, 'unavailable'],
    [{ code: '57P01' }, 'unavailable'],
    [{ code: '08006' }, 'unavailable'],
    [{ code: '53300' }, 'unavailable'],
    [{ code: '40P01' }, 'unavailable'],
    [{ driverError: { code: '57P03' } }, 'unavailable'],
    [new AggregateError([{ code: 'ECONNREFUSED' }, { code: 'ECONNREFUSED' }]), 'unavailable'],
    [new Error('Connection terminated unexpectedly'), 'unavailable'],
    [new Error('timeout exceeded when trying to connect'), 'unavailable'],
    [{ code: '53100' }, 'full'],
    [{ code: 'ENOSPC' }, 'full'],
  ])('%j is %s', (error, kind) => {
    const fault = serverTrouble(error);
    expect(fault).toBeInstanceOf(Fault);
    expect(fault).toMatchObject({ kind, retryAfter_s: expect.any(Number) as number });
  });

  it.each([[{ code: '23505' }], [{ code: '42P01' }], [new Error('no')], [null], ['x']])(
    '%j is a defect, not trouble',
    (error) => {
      expect(serverTrouble(error)).toBeNull();
    },
  );
});
