import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PASSWORD, TestApp, type TestPerson } from '../../support/test-app.ts';

let app: TestApp;
let person: TestPerson;
beforeAll(async () => {
  app = await TestApp.open();
  person = await app.person();
});
afterAll(() => app.close());

async function signIn(): Promise<ReturnType<TestApp['visitor']>> {
  const visitor = app.visitor();
  await visitor.post('/api/sessions', { email: person.email, password: PASSWORD }).expect(201);
  return visitor;
}

describe('the session cookie', () => {
  it('is bound to this host, unreadable for scripts, sent to our own pages and small', async () => {
    const visitor = app.visitor();
    const answer = await visitor.post('/api/sessions', { email: person.email, password: PASSWORD }).expect(201);
    const cookies = answer.headers['set-cookie'] as unknown as string[];
    const cookie = cookies.find((one) => one.startsWith('__Host-sid=')) ?? '';
    expect(cookie).toMatch(/; Secure(;|$)/);
    expect(cookie).toMatch(/; HttpOnly(;|$)/);
    expect(cookie).toMatch(/; SameSite=Lax(;|$)/);
    expect(cookie).toMatch(/; Path=\/(;|$)/);
    expect(cookie).not.toMatch(/Domain=/i);
    expect(cookie.length).toBeLessThan(4096);
    const token = visitor.cookies.get('__Host-sid') ?? '';
    expect(Buffer.from(token, 'base64url').length).toBe(32);
    expect(JSON.stringify(answer.body)).not.toContain(token);
  });

  it('is stored as a hash only', async () => {
    const visitor = await signIn();
    const token = visitor.cookies.get('__Host-sid') ?? '';
    const rows = await app.owner.query<{ all: string }>("SELECT string_agg(s::text, ' ') AS all FROM session s");
    expect(rows.rows[0]?.all).toContain(createHash('sha256').update(token).digest('hex'));
    expect(rows.rows[0]?.all).not.toContain(token);
  });

  it('is new at every sign-in: a planted one never becomes valid', async () => {
    const visitor = app.visitor();
    visitor.cookies.set('__Host-sid', 'planted'.repeat(6));
    await visitor.post('/api/sessions', { email: person.email, password: PASSWORD }).expect(201);
    expect(visitor.cookies.get('__Host-sid')).not.toBe('planted'.repeat(6));
    const planted = app.visitor();
    planted.cookies.set('__Host-sid', 'planted'.repeat(6));
    await planted.get('/api/sites').expect(401);
  });

  it('counts only as a cookie: not in the address, not as a bearer', async () => {
    const visitor = await signIn();
    const token = visitor.cookies.get('__Host-sid') ?? '';
    const bare = app.visitor();
    await bare.get(`/api/sites?__Host-sid=${token}`).expect(401);
    await bare.get('/api/sites').set('Authorization', `Bearer ${token}`).expect(401);
  });
});

describe('the end of a session', () => {
  it('comes with signing out: the old cookie opens nothing any more', async () => {
    const visitor = await signIn();
    const replay = app.visitor();
    replay.cookies.set('__Host-sid', visitor.cookies.get('__Host-sid') ?? '');
    await visitor.delete('/api/sessions/current').expect(204);
    expect(visitor.cookies.has('__Host-sid')).toBe(false);
    for (const path of ['/api/sessions/current', '/api/sites', '/api/materials']) await replay.get(path).expect(401);
  });

  it('comes after 12 hours without use', async () => {
    const visitor = await signIn();
    app.clock.forward(11.9);
    await visitor.get('/api/sites').expect(200);
    app.clock.forward(11.9);
    await visitor.get('/api/sites').expect(200);
    app.clock.forward(12.1);
    await visitor.get('/api/sites').expect(401);
    app.clock.forward(-12);
    await visitor.get('/api/sites').expect(401);
  });

  it('comes after 7 days however much it is used', async () => {
    const visitor = await signIn();
    for (let hour = 0; hour + 8 < 7 * 24; hour += 8) {
      await visitor.get('/api/sites').expect(200);
      app.clock.forward(8);
    }
    const last = await visitor.get('/api/sessions/current').expect(200);
    const end = Date.parse((last.body as { session: { expires_at: string } }).session.expires_at);
    expect(end - app.clock.now().getTime()).toBeLessThanOrEqual(8 * 3600 * 1000);
    app.clock.forward(8);
    await visitor.get('/api/sites').expect(401);
  });

  it('does not write at every read: the end moves at most once a minute', async () => {
    const visitor = await signIn();
    const ends = async (): Promise<string | undefined> => {
      const rows = await app.owner.query<{ end: string }>(
        'SELECT max(expires_at)::text AS end FROM session WHERE person_id = $1',
        [person.personId],
      );
      return rows.rows[0]?.end;
    };
    const before = await ends();
    await visitor.get('/api/sites').expect(200);
    expect(await ends()).toBe(before);
    app.clock.forward(1);
    await visitor.get('/api/sites').expect(200);
    expect(await ends()).not.toBe(before);
  });
});
