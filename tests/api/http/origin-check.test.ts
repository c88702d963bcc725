import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PASSWORD, TestApp, type TestPerson } from '../../support/test-app.ts';

let app: TestApp;
let person: TestPerson;
beforeAll(async () => {
  app = await TestApp.open();
  person = await app.person();
});
afterAll(() => app.close());

const site = () => ({ id: randomUUID(), name: 'Forged', address: '', time_zone: 'UTC' });
const sites = async (): Promise<number> => {
  const rows = await app.owner.query<{ count: number }>(
    "SELECT count(*)::int AS count FROM site WHERE name = 'Forged'",
  );
  return rows.rows[0]?.count ?? -1;
};
/** A POST with the person's cookie and just these headers. */
const post = (headers: Record<string, string>) => person.visitor.bare('post', '/api/sites').set(headers).send(site());

describe('a request that could be forged', () => {
  it.each([
    ['nothing but the cookie', {}],
    ['our header but no word of where it comes from', { 'X-Embertally': 'web' }],
    ['our origin but not our header', { Origin: 'OURS' }],
    ['our origin and another value of our header', { Origin: 'OURS', 'X-Embertally': 'x' }],
    ['a foreign origin', { Origin: 'https://evil.example', 'X-Embertally': 'web' }],
    ['the origin null', { Origin: 'null', 'X-Embertally': 'web' }],
    ['our host by another scheme', { Origin: 'HTTPS', 'X-Embertally': 'web' }],
    ['fetch metadata of another site', { 'Sec-Fetch-Site': 'cross-site', 'X-Embertally': 'web' }],
    ['fetch metadata of a sibling site', { 'Sec-Fetch-Site': 'same-site', 'X-Embertally': 'web' }],
    [
      'our origin, but metadata that says cross-site',
      { Origin: 'OURS', 'Sec-Fetch-Site': 'cross-site', 'X-Embertally': 'web' },
    ],
    ['a typed address', { 'Sec-Fetch-Site': 'none', 'X-Embertally': 'web' }],
  ])('with %s is refused', async (_name, headers) => {
    const real = Object.fromEntries(
      Object.entries(headers).map(([name, value]) => [
        name,
        value === 'OURS' ? app.url : value === 'HTTPS' ? app.url.replace('http:', 'https:') : value,
      ]),
    );
    const answer = await post(real);
    expect(answer.status).toBe(403);
    expect(answer.headers['content-type']).toBe('application/problem+json; charset=utf-8');
    expect(await sites()).toBe(0);
  });

  it('as plain text holding JSON is refused', async () => {
    const answer = await person.visitor
      .bare('post', '/api/sites')
      .set({ 'Content-Type': 'text/plain', Origin: app.url, 'X-Embertally': 'web' })
      .send(JSON.stringify(site()));
    expect(answer.status).toBe(415);
    expect(await sites()).toBe(0);
  });

  it('to sign a victim in as somebody else is refused', async () => {
    await app
      .visitor()
      .bare('post', '/api/sessions')
      .set({ 'Sec-Fetch-Site': 'cross-site', 'X-Embertally': 'web' })
      .send({ email: person.email, password: PASSWORD })
      .expect(403);
  });
});

describe('a request of our own pages', () => {
  it.each([
    ['metadata', { 'Sec-Fetch-Site': 'same-origin' }],
    ['origin', { Origin: 'OURS' }],
    ['both', { 'Sec-Fetch-Site': 'same-origin', Origin: 'OURS' }],
  ])('told by %s is taken', async (_name, headers) => {
    const real = Object.fromEntries(
      Object.entries(headers).map(([name, value]) => [name, value === 'OURS' ? app.url : value]),
    );
    await person.visitor
      .bare('post', '/api/sites')
      .set({ ...real, 'X-Embertally': 'web' })
      .send({ ...site(), name: 'Honest' })
      .expect(201);
  });
});

describe('other origins', () => {
  it('are told nothing: no CORS header on a preflight or a read', async () => {
    const preflight = await fetch(`${app.url}/api/sites`, {
      method: 'OPTIONS',
      headers: { Origin: 'https://evil.example', 'Access-Control-Request-Method': 'POST' },
    });
    const read = await fetch(`${app.url}/api/cautions`, { headers: { Origin: 'https://evil.example' } });
    for (const answer of [preflight, read]) expect(answer.headers.get('access-control-allow-origin')).toBeNull();
  });
});
