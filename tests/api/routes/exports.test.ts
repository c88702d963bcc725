import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import type { ReportInput } from '../../../api/src/reports/report-input.ts';
import { box, groundFloor, uid, withRoom } from '../../support/survey-builder.ts';
import { TestApp, creating, type TestBook, type TestPerson } from '../../support/test-app.ts';

let app: TestApp;
let person: TestPerson;
let book: TestBook;
/** What the maker does next; a fake at the port, so that moments can be chosen. */
let make: (input: ReportInput, onProgress: (fraction: number) => void, signal: AbortSignal) => Promise<Uint8Array>;
const PDF = new TextEncoder().encode('%PDF-1.7 a report');

beforeAll(async () => {
  app = await TestApp.open({ makeReport: (...given) => make(...given) });
  person = await app.person('Mara Quill');
  book = await app.book(person);
  const room = withRoom(groundFloor({ id: book.storeyId }), 'Décor £ “dock”', box(0, 0, 6, 4), {
    storey_id: book.storeyId,
  });
  await app.change(person, book.surveyId, creating(room, [book.storeyId]));
});
afterAll(() => app.close());

type Asked = {
  id: string;
  state: string;
  progress: number;
  problem: string | null;
  bytes: number | null;
  file_name: string | null;
};
const ask = (body: object = {}) =>
  person.visitor.post(`/api/surveys/${book.surveyId}/exports`, {
    id: randomUUID(),
    kind: 'survey-report',
    room_id: null,
    units: 'SI',
    ...body,
  });
const read = async (id: string): Promise<Asked> =>
  (await person.visitor.get(`/api/exports/${id}`).expect(200)).body as Asked;
const reaches = (id: string, state: string) =>
  vi.waitFor(async () => expect((await read(id)).state).toBe(state), { timeout: 20_000, interval: 100 });

describe('an export', () => {
  it('is made off the request, from the survey and its limits, and fetched as a file to keep', async () => {
    const given: ReportInput[] = [];
    make = (input, onProgress) => {
      given.push(input);
      onProgress(0.5);
      return Promise.resolve(PDF);
    };
    const asked = (await ask({ kind: 'room-tally', room_id: uid('Décor £ “dock”'), units: 'US' }).expect(202))
      .body as Asked;
    expect(asked).toMatchObject({ state: 'waiting', progress: 0 });
    await person.visitor.get(`/api/exports/${asked.id}/file`).expect(409);
    await reaches(asked.id, 'ready');
    expect(given[0]).toMatchObject({
      kind: 'room-tally',
      units: 'US',
      building: 'Store',
      site: 'Gull Street',
      made_by: 'Mara Quill',
      time_zone: 'Europe/London',
      document: { survey_id: book.surveyId, sequence: 1 },
      limits: [],
    });
    const file = await person.visitor.get(`/api/exports/${asked.id}/file`).expect(200);
    expect(file.headers).toMatchObject({
      'content-type': 'application/pdf',
      'content-security-policy': "sandbox; default-src 'none'",
      'x-content-type-options': 'nosniff',
    });
    expect(file.headers['content-disposition']).toBe(
      `attachment; filename="Store-D-cor-dock-sequence-1.pdf"; filename*=UTF-8''Store-D%C3%A9cor-dock-sequence-1.pdf`,
    );
    expect(Buffer.from(file.body as Buffer).toString()).toBe('%PDF-1.7 a report');
    expect(await read(asked.id)).toMatchObject({ bytes: PDF.byteLength, progress: 1 });
  });

  it('asked for twice is made once', async () => {
    let made = 0;
    make = () => {
      made += 1;
      return Promise.resolve(PDF);
    };
    const id = randomUUID();
    await ask({ id }).expect(202);
    await ask({ id }).expect(202);
    await reaches(id, 'ready');
    expect(made).toBe(1);
    await ask({ id, units: 'US' }).expect(409);
  });

  it('is stopped when that is wished: the work is told and no file is left', async () => {
    let told = false;
    make = (_input, _onProgress, signal) =>
      new Promise((_done, failed) => {
        signal.addEventListener('abort', () => {
          told = true;
          failed(new Error('stopped'));
        });
      });
    const { id } = (await ask().expect(202)).body as Asked;
    await reaches(id, 'running');
    await person.visitor.delete(`/api/exports/${id}`).expect(204);
    await vi.waitFor(() => expect(told).toBe(true), { timeout: 5000 });
    expect(await read(id)).toMatchObject({ state: 'stopped', bytes: null });
    await person.visitor.get(`/api/exports/${id}/file`).expect(409);
  });

  it('that cannot be made says so in a sentence and keeps the reason to the log', async () => {
    make = () => Promise.reject(new Error('secret inner reason'));
    const { id } = (await ask().expect(202)).body as Asked;
    await reaches(id, 'failed');
    const failed = await read(id);
    expect(failed.problem).toMatch(/could not be made/);
    expect(JSON.stringify(failed)).not.toContain('secret inner reason');
  });

  it('whose process died for good is said to have failed, one being worked on is not', async () => {
    make = () => Promise.resolve(PDF);
    const [dead, alive] = [((await ask().expect(202)).body as Asked).id, ((await ask().expect(202)).body as Asked).id];
    for (const id of [dead, alive]) await reaches(id, 'ready');
    const leave = "UPDATE export SET state = 'running', updated_at = $2 WHERE id = $1";
    const now = app.clock.now().getTime();
    await app.owner.query(leave, [dead, new Date(now - 21 * 60 * 1000)]);
    await app.owner.query(leave, [alive, new Date(now - 19 * 60 * 1000)]);
    await app.house.services.exports.failAbandoned();
    expect(await read(dead)).toMatchObject({ state: 'failed', problem: expect.stringMatching(/try again/) as string });
    expect(await read(alive)).toMatchObject({ state: 'running' });
    await app.owner.query("UPDATE export SET state = 'stopped' WHERE id = $1", [alive]);
  });

  it.each([
    ['a tally of no room', { kind: 'room-tally', room_id: null }],
    ['a tally of a room elsewhere', { kind: 'room-tally', room_id: randomUUID() }],
    ['a report of the survey that names a room', { kind: 'survey-report', room_id: uid('Décor £ “dock”') }],
    ['units nobody reads', { units: 'cubits' }],
  ])('of %s is refused', async (_name, body) => {
    await ask(body).expect(422);
  });

  it('beyond five at a time waits its turn', async () => {
    let finish: () => void = () => undefined;
    const hold = new Promise<Uint8Array>((done) => (finish = () => done(PDF)));
    make = () => hold;
    const ids: string[] = [];
    for (let one = 0; one < 5; one += 1) ids.push(((await ask().expect(202)).body as Asked).id);
    await ask().expect(429);
    finish();
    for (const id of ids) await reaches(id, 'ready');
  }, 40_000);
});
