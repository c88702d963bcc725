import { afterAll, beforeEach, describe, expect, it } from 'vitest';
import { PASSWORD, TestApp, type TestPerson } from '../../support/test-app.ts';
import type { Visitor } from '../../support/visitor.ts';

let app: TestApp;
let person: TestPerson;
const WRONG = 'not at all the right words';

beforeEach(async () => {
  app ??= await TestApp.open();
  await app.owner.query('TRUNCATE sign_in_attempt');
  person = await app.person();
});
afterAll(() => app.close());

const tryIn = (visitor: Visitor, email: string, password: string) => visitor.post('/api/sessions', { email, password });

describe('guessing at one account', () => {
  it('is held back after ten failures, with the time to wait, then let on with doubled waits', async () => {
    const visitor = app.visitor();
    for (let guess = 0; guess < 10; guess += 1) await tryIn(visitor, person.email, WRONG).expect(401);
    const held = await tryIn(visitor, person.email, PASSWORD).expect(429);
    const wait_s = Number(held.headers['retry-after']);
    expect(wait_s).toBeGreaterThan(0);
    expect(wait_s).toBeLessThanOrEqual(30);
    app.clock.forward((wait_s + 1) / 3600);
    await tryIn(visitor, person.email, WRONG).expect(401);
    const again = await tryIn(visitor, person.email, PASSWORD).expect(429);
    expect(Number(again.headers['retry-after'])).toBeGreaterThan(30);
    app.clock.forward(0.26);
    await tryIn(visitor, person.email, PASSWORD).expect(201);
  });

  it('does not lock the person out of a device they are known on', async () => {
    const own = app.visitor();
    await tryIn(own, person.email, PASSWORD).expect(201);
    const attacker = app.visitor();
    for (let guess = 0; guess < 10; guess += 1) await tryIn(attacker, person.email, WRONG).expect(401);
    await tryIn(attacker, person.email, PASSWORD).expect(429);
    await tryIn(own, person.email, PASSWORD).expect(201);
  });

  it('gains nothing by being done at once', async () => {
    const answers = await Promise.all(
      Array.from({ length: 30 }, () => tryIn(app.visitor(), person.email, WRONG).then((answer) => answer.status)),
    );
    expect(answers.filter((status) => status === 401)).toHaveLength(10);
    expect(answers.filter((status) => status === 429)).toHaveLength(20);
  });

  it('is remembered by the database: another process holds it back too', async () => {
    const visitor = app.visitor();
    for (let guess = 0; guess < 10; guess += 1) await tryIn(visitor, person.email, WRONG).expect(401);
    const other = await TestApp.open({ database: app.database });
    await tryIn(other.visitor(), person.email, PASSWORD).expect(429);
    await other.close();
  });
});

describe('spraying one password over many accounts', () => {
  it('is held back after sixty failures from one address', async () => {
    const visitor = app.visitor();
    let held = 0;
    for (let account = 0; account < 61; account += 1) {
      const { status } = await tryIn(visitor, `nobody${account}@nowhere.example`, WRONG);
      if (status === 429) held = account;
    }
    expect(held).toBe(60);
  });
});

describe('a wrong password and an unknown address', () => {
  it('are answered alike', async () => {
    const known = await tryIn(app.visitor(), person.email, WRONG).expect(401);
    const unknown = await tryIn(app.visitor(), 'nobody@nowhere.example', WRONG).expect(401);
    const shape = ({ body, headers }: typeof known) => {
      const { requestId: _id, ...rest } = body as Record<string, unknown>;
      return { rest, headers: Object.keys(headers).sort() };
    };
    expect(shape(known)).toEqual(shape(unknown));
  });

  it('take as long: the work is the same, so the medians of interleaved tries lie close', async () => {
    const times = { known: [] as number[], unknown: [] as number[] };
    const timed = async (kind: keyof typeof times, email: string): Promise<void> => {
      const from = performance.now();
      await tryIn(app.visitor(), email, WRONG);
      times[kind].push(performance.now() - from);
    };
    for (let round = 0; round < 25; round += 1) {
      await app.owner.query('TRUNCATE sign_in_attempt');
      await timed('known', person.email);
      await timed('unknown', `nobody${round}@nowhere.example`);
    }
    const median = (values: number[]): number => values.sort((a, b) => a - b)[12] ?? 0;
    const ratio = median(times.known) / median(times.unknown);
    expect(ratio).toBeGreaterThan(0.75);
    expect(ratio).toBeLessThan(1.33);
  });
});

describe('credentials of the wrong kind', () => {
  it.each([
    [{ email: { $ne: null }, password: 'x' }],
    [{ email: ['a@b.example'], password: 'x' }],
    [{ email: 5, password: 5 }],
    [{ email: 'a@b.example', password: { length: 20 } }],
    [{ email: 'a@b.example', password: 'x'.repeat(10_000) }],
    [{ email: 'a@b.example', password: 'x', role: 'admin' }],
    [{}],
  ])('%j is 422', async (body) => {
    await app.visitor().post('/api/sessions', body).expect(422);
  });
});
