import { randomUUID } from 'node:crypto';
import { afterAll, afterEach, beforeAll, describe, expect, it, vi } from 'vitest';
import { box, crate, groundFloor, uid, withEntries, withRoom } from '../../support/survey-builder.ts';
import { TestApp, creating, type TestBook, type TestPerson } from '../../support/test-app.ts';

let one: TestApp;
let two: TestApp;
let person: TestPerson;
let book: TestBook;
const open: AbortController[] = [];

beforeAll(async () => {
  one = await TestApp.open({ heartbeat_ms: 150 });
  two = await TestApp.open({ database: one.database, heartbeat_ms: 150 });
  person = await one.person();
  book = await one.book(person);
  const floor = groundFloor({ id: book.storeyId });
  const drawn = withEntries(
    withRoom(floor, 'dock', box(0, 0, 6, 4), { storey_id: book.storeyId }),
    crate('crate', 'dock', 2, 2),
  );
  await one.change(person, book.surveyId, creating(drawn, [book.storeyId]));
});
afterEach(() => {
  for (const stream of open.splice(0)) stream.abort();
});
afterAll(async () => {
  await two.close();
  await one.close();
});

interface Listening {
  readonly sequences: number[];
  readonly comments: string[];
  readonly ended: Promise<void>;
}

/** Reads a stream of events through one of the two processes. */
async function listen(app: TestApp, who: TestPerson, lastEventId?: number): Promise<Listening> {
  const stop = new AbortController();
  open.push(stop);
  const answer = await fetch(`${app.url}/api/surveys/${book.surveyId}/events`, {
    headers: {
      cookie: who.visitor.cookieHeader(),
      ...(lastEventId === undefined ? {} : { 'Last-Event-ID': String(lastEventId) }),
    },
    signal: stop.signal,
  });
  expect(answer.status).toBe(200);
  expect(answer.headers.get('content-type')).toBe('text/event-stream; charset=utf-8');
  const sequences: number[] = [];
  const comments: string[] = [];
  const read = async (): Promise<void> => {
    const decoder = new TextDecoder();
    for await (const chunk of answer.body ?? []) {
      for (const line of decoder.decode(chunk).split('\n')) {
        if (line.startsWith('id: ')) sequences.push(Number(line.slice(4)));
        if (line.startsWith(': ')) comments.push(line);
      }
    }
  };
  const ended = read().catch((error: unknown) => {
    if (!stop.signal.aborted) throw error;
  });
  return { sequences, comments, ended };
}

let value = 1;
async function change(through: TestApp): Promise<number> {
  const changes = [
    { kind: 'entry' as const, id: uid('crate'), before: { count: value }, after: { count: (value += 1) } },
  ];
  return through.change(person, book.surveyId, changes);
}

describe('the stream of a survey', () => {
  it('tells of a change made through the same process and of one made through another', async () => {
    const near = await listen(one, person);
    const far = await listen(two, person);
    const first = await change(one);
    const second = await change(two);
    await vi.waitFor(() => {
      expect(near.sequences).toEqual([first, second]);
      expect(far.sequences).toEqual([first, second]);
    });
  });

  it('goes on where a browser says it stopped', async () => {
    const first = await change(one);
    const second = await change(one);
    const late = await listen(two, person, first - 1);
    await vi.waitFor(() => expect(late.sequences).toEqual([first, second]));
  });

  it('catches up when the connection that listens was cut', async () => {
    // Its heart beats every 20 s: only the connection can bring the news in time.
    const quiet = await TestApp.open({ database: one.database });
    const far = await listen(quiet, person);
    await one.house.database.statements.query(
      "SELECT pg_terminate_backend(pid) FROM pg_stat_activity WHERE application_name = 'embertally feed'",
    );
    const sequence = await change(one);
    await vi.waitFor(() => expect(far.sequences).toContain(sequence), { timeout: 5000 });
    await quiet.close();
  });

  it('beats, and ends when the session or the role is gone', async () => {
    const visitor = await one.person('Reader', 'Elsewhere');
    const roleId = await one.give(person, book.siteId, visitor, 'viewer');
    const byRole = await listen(one, visitor);
    await vi.waitFor(() => expect(byRole.comments.length).toBeGreaterThan(0));
    await person.visitor.delete(`/api/sites/${book.siteId}/roles/${roleId}`).expect(204);
    await byRole.ended;

    const own = await one.signedIn(person.email);
    const bySession = await listen(one, own);
    await own.visitor.delete('/api/sessions/current').expect(204);
    await bySession.ended;
  });

  it('is 404 for a stranger', async () => {
    const stranger = await one.person('Stranger', 'Elsewhere');
    const answer = await fetch(`${one.url}/api/surveys/${book.surveyId}/events`, {
      headers: { cookie: stranger.visitor.cookieHeader() },
    });
    expect(answer.status).toBe(404);
  });
});

describe('the feed', () => {
  it('gives accepted sets after a number, oldest first, a page at a time', async () => {
    const sequence = await change(one);
    await change(two);
    const path = `/api/surveys/${book.surveyId}/changes`;
    const page = await person.visitor.get(`${path}?after=${sequence - 1}&limit=1`).expect(200);
    expect(page.body).toMatchObject({
      items: [{ sequence, by: { name: person.name } }],
      more: true,
      sequence: sequence + 1,
    });
    const rest = await person.visitor.get(`${path}?after=${sequence}`).expect(200);
    expect(rest.body).toMatchObject({ items: [{ sequence: sequence + 1 }], more: false });
    await person.visitor.get(path).expect(422);
    await person.visitor.get(`${path}?after=-1`).expect(422);
    await person.visitor.get(`${path}?after=0&after=1`).expect(422);
    await person.visitor.get(`${path}?after=0&other=1`).expect(422);
  });
});

describe('two processes on one database', () => {
  it('serve one session and the same document', async () => {
    const path = `/api/surveys/${book.surveyId}/document`;
    const sequence = await change(one);
    // The same browser, with the same cookie, at the other door.
    const elsewhere = two.visitor();
    for (const [name, token] of person.visitor.cookies) elsewhere.cookies.set(name, token);
    const here = await person.visitor.get(path).expect(200).expect('ETag', `"s${sequence}"`);
    const there = await elsewhere.get(path).expect(200).expect('ETag', `"s${sequence}"`);
    expect(there.text).toBe(here.text);
    const change2 = [{ kind: 'entry', id: uid('crate'), before: { count: value }, after: { count: (value += 1) } }];
    await elsewhere
      .post(`/api/surveys/${book.surveyId}/change-sets`, { id: randomUUID(), label: 'x', changes: change2 })
      .expect(201);
    await person.visitor
      .get(path)
      .expect(200)
      .expect('ETag', `"s${sequence + 1}"`);
  });
});
