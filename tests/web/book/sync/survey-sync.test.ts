import { addEntries } from '@embertally/shared/survey/commands/add-entries';
import { deleteEntries } from '@embertally/shared/survey/commands/delete-entries';
import { drawRoom } from '@embertally/shared/survey/commands/draw-room';
import { editEntries } from '@embertally/shared/survey/commands/edit-entries';
import { editRoom } from '@embertally/shared/survey/commands/edit-room';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { BookSession } from '@embertally/web/src/book/session/book-session.ts';
import { surveyServer } from '@embertally/web/src/book/sync/survey-server.ts';
import { SurveySync } from '@embertally/web/src/book/sync/survey-sync.ts';
import { expect, test, vi } from 'vitest';
import { box, crate, done, drawing, groundFloor, uid, withEntries, withRoom } from '../../../support/survey-builder.ts';
import { NOW, surveySample } from '../book-driver.ts';
import { FakeSurveyApi } from './fake-survey-api.ts';
import { MemoryOutbox } from './memory-outbox.ts';

const A = uid('a');

function store(): SurveyDocument {
  return withEntries(
    withRoom(groundFloor(), 'store', box(0, 0, 6, 4)),
    crate('a', 'store', 2, 2),
    crate('b', 'store', 4, 2),
  );
}

let made = 0;
function opened(api: FakeSurveyApi, outbox: MemoryOutbox, document = api.document) {
  const newId = () => uid(`id ${(made += 1)}`);
  const session: BookSession = new BookSession(
    { survey: surveySample(), document, limits: [], units: 'SI', canEdit: true, person: 'Ines Okoro' },
    {
      newId,
      now: () => NOW,
      queue: (set) => {
        sync.enqueue(set);
      },
      keepSteps: (steps) => {
        sync.keepSteps(steps);
      },
    },
  );
  const sync = new SurveySync(session, document, {
    outbox,
    server: surveyServer(document.surveyId),
    newId,
    now: () => NOW,
    jitter: () => 0,
  });
  return { session, sync };
}

async function start(document = store()) {
  const api = new FakeSurveyApi(document);
  const outbox = new MemoryOutbox();
  const book = opened(api, outbox);
  await book.sync.start();
  return { api, outbox, ...book };
}

const count = (session: BookSession, value: number, id = A) =>
  session.run(editEntries, { entry_ids: [id], patch: { count: value } }, `Counted ${value}`);
const saving = (session: BookSession) => session.state.saving;
const until = (holds: () => void) => vi.waitFor(holds, { interval: 1, timeout: 5000 });
const saved = (session: BookSession) =>
  until(() => {
    expect(saving(session)).toMatchObject({ state: 'saved', unsent: 0 });
  });

const theirCount = (api: FakeSurveyApi, value: number, id = A) => {
  const { changes } = done(api.document, editEntries, { entry_ids: [id], patch: { count: value } });
  api.theirs({ id: uid(`theirs ${value}`), label: 'Counted', changes: [...changes] });
};

test('a gesture is kept on the device, sent, accepted and forgotten', async () => {
  const { api, outbox, session, sync } = await start();
  count(session, 3);
  expect(saving(session)).toMatchObject({ state: 'saving', unsent: 1 });
  await saved(session);
  await sync.settled();
  expect(saving(session).savedAt).toBe(NOW);
  expect(outbox.kept.size).toBe(0);
  expect(api.agreesWith(session.state.document)).toBe(true);
  expect(session.state.document.entries.get(A)?.count).toBe(3);
});

test('gestures go one at a time and in order, undo as a set of its own', async () => {
  const { api, session } = await start();
  session.run(drawRoom, drawing('annex', box(6, 0, 3, 4)), 'Drew a room');
  session.run(addEntries, { entries: [crate('c', 'annex', 7, 2)] }, 'Placed c');
  session.undo();
  await saved(session);
  expect(api.feed.map(({ label }) => label)).toEqual(['Drew a room', 'Placed c', 'Undone: Placed c']);
  expect(api.agreesWith(session.state.document)).toBe(true);
});

test('without a network changes are kept, counted, and sent when it is back', async () => {
  const { api, outbox, session, sync } = await start();
  api.net.goOffline();
  count(session, 3);
  count(session, 4);
  await until(() => {
    expect(saving(session)).toMatchObject({ state: 'kept', unsent: 2, why: 'offline' });
  });
  await sync.settled();
  expect(outbox.kept.size).toBe(2);
  api.net.goOnline();
  sync.retryNow();
  await saved(session);
  expect(api.document.entries.get(A)?.count).toBe(4);
});

test.each([
  [401, 'signed-out'],
  [503, 'server'],
  [429, 'server'],
] as const)('a %i keeps the change and says why', async (status, why) => {
  const { api, session, sync } = await start();
  api.refuse(status, 'Not now.');
  count(session, 3);
  await until(() => {
    expect(saving(session)).toMatchObject({ state: 'kept', unsent: 1, why });
  });
  api.accept();
  sync.retryNow();
  await saved(session);
  expect(api.document.entries.get(A)?.count).toBe(3);
});

test('a reload loses nothing: what waited is shown again and sent once', async () => {
  const { api, outbox, session, sync } = await start();
  api.net.goOffline();
  count(session, 3);
  session.run(drawRoom, drawing('annex', box(6, 0, 3, 4)), 'Drew a room');
  await sync.settled();
  sync.stop();
  api.net.goOnline();
  const again = opened(api, outbox, api.document);
  await again.sync.start();
  expect(again.session.state.document.entries.get(A)?.count).toBe(3);
  expect(again.session.state.document.rooms.size).toBe(2);
  await saved(again.session);
  await again.sync.settled();
  expect(api.feed.map(({ label }) => label)).toEqual(['Counted 3', 'Drew a room']);
  expect(outbox.kept.size).toBe(0);
});

test('undo survives a reload, and what was undone stays undone', async () => {
  const { api, outbox, session, sync } = await start();
  count(session, 3);
  count(session, 4);
  session.undo();
  await saved(session);
  await sync.settled();
  sync.stop();
  const again = opened(api, outbox, api.document);
  await again.sync.start();
  expect(again.session.state.canUndo).toBe('Counted 3');
  again.session.undo();
  await saved(again.session);
  expect(api.document.entries.get(A)?.count).toBe(1);
  expect(again.session.state.canUndo).toBeNull();
});

test('an answer lost after the server took the set is not taken twice', async () => {
  const { api, session, sync } = await start();
  api.loseAnswers = 1;
  count(session, 3);
  await until(() => {
    expect(saving(session).state).toBe('kept');
  });
  sync.retryNow();
  await saved(session);
  expect(api.sent).toHaveLength(2);
  expect(api.feed).toHaveLength(1);
});

test('other people’s changes arrive without an undo step and merge with mine', async () => {
  const { api, session, sync } = await start();
  theirCount(api, 9, uid('b'));
  await sync.catchUp();
  expect(session.state.document.entries.get(uid('b'))?.count).toBe(9);
  expect(session.state.canUndo).toBeNull();
  count(session, 3);
  await saved(session);
  expect(api.agreesWith(session.state.document)).toBe(true);
  expect(session.state.document.sequence).toBeLessThanOrEqual(api.document.sequence);
});

test('two fields of one row changed by two people both stay', async () => {
  const { api, session } = await start();
  theirCount(api, 9);
  session.run(editEntries, { entry_ids: [A], patch: { label: 'crates' } }, 'Renamed');
  await saved(session);
  await until(() => {
    expect(session.state.document.entries.get(A)).toMatchObject({ count: 9, label: 'crates' });
  });
  expect(api.document.entries.get(A)).toMatchObject({ count: 9, label: 'crates' });
});

async function clashed() {
  const book = await start();
  theirCount(book.api, 9);
  count(book.session, 3);
  await until(() => {
    expect(saving(book.session).state).toBe('clash');
  });
  return book;
}

test('the same field changed by two people is a clash with both values, who and when; mine stays in view', async () => {
  const { session } = await clashed();
  const [held] = saving(session).held;
  expect(held?.clashes[0]).toMatchObject({
    field: 'count',
    base: 1,
    theirs: 9,
    mine: 3,
    by: 'Tamsin Reddaway',
    at: NOW,
  });
  expect(session.state.document.entries.get(A)?.count).toBe(3);
});

test('keep mine sends a new set made on theirs', async () => {
  const { api, session, sync } = await clashed();
  const [held] = saving(session).held;
  await sync.keepMine(held?.id ?? '');
  await saved(session);
  expect(api.document.entries.get(A)?.count).toBe(3);
  expect(api.feed.at(-1)?.changes).toEqual([{ kind: 'entry', id: A, before: { count: 9 }, after: { count: 3 } }]);
  expect(api.feed.at(-1)?.id).not.toBe(held?.id);
});

test('take theirs shows theirs and closes the way back', async () => {
  const { api, outbox, session, sync } = await clashed();
  const [held] = saving(session).held;
  await sync.takeTheirs(held?.id ?? '');
  await saved(session);
  await sync.settled();
  expect(session.state.document.entries.get(A)?.count).toBe(9);
  expect(session.state.canUndo).toBeNull();
  expect(outbox.kept.size).toBe(0);
  expect(api.agreesWith(session.state.document)).toBe(true);
});

test('an unresolved clash survives a reload with both values', async () => {
  const { api, outbox, sync } = await clashed();
  await sync.settled();
  sync.stop();
  const again = opened(api, outbox, api.document);
  await again.sync.start();
  expect(saving(again.session)).toMatchObject({ state: 'clash', unsent: 1 });
  expect(again.session.state.document.entries.get(A)?.count).toBe(3);
});

test('an edit to something deleted is offered as a recovered copy', async () => {
  const { api, session, sync } = await start();
  const gone = done(api.document, deleteEntries, { entry_ids: [A] });
  api.theirs({ id: uid('their deletion'), label: 'Deleted', changes: [...gone.changes] });
  count(session, 3);
  await until(() => {
    expect(saving(session).held[0]?.clashes[0]?.reason).toBe('gone');
  });
  await sync.keepMine(saving(session).held[0]?.id ?? '');
  await saved(session);
  const copies = [...api.document.entries.values()].filter(({ label }) => label === 'a');
  expect(copies).toHaveLength(1);
  expect(copies[0]).toMatchObject({ count: 3, x_m: 2, y_m: 2 });
  expect(copies[0]?.id).not.toBe(A);
});

test('a refused set waits with its reason while the others go on', async () => {
  const { api, session } = await start();
  api.refuse(422, 'The name is not allowed here.', ({ label }) => label === 'Renamed');
  session.run(editRoom, { room_id: uid('store'), patch: { name: 'X' } }, 'Renamed');
  count(session, 3);
  await until(() => {
    expect(saving(session)).toMatchObject({ state: 'attention', unsent: 1 });
  });
  expect(saving(session).held[0]?.reason).toBe('The name is not allowed here.');
  expect(api.document.entries.get(A)?.count).toBe(3);
});

test('what builds on a refused set waits with it, and goes with it when it is sent again', async () => {
  const { api, session, sync } = await start();
  api.refuse(422, 'No room here.', ({ label }) => label === 'Drew a room');
  session.run(drawRoom, drawing('annex', box(6, 0, 3, 4)), 'Drew a room');
  session.run(addEntries, { entries: [crate('c', 'annex', 7, 2)] }, 'Placed c');
  count(session, 3);
  await until(() => {
    expect(saving(session)).toMatchObject({ state: 'attention', unsent: 2 });
  });
  expect(saving(session).held[0]).toMatchObject({ label: 'Drew a room', waiting: 1 });
  expect(api.feed.map(({ label }) => label)).toEqual(['Counted 3']);
  api.accept();
  await sync.keepMine(saving(session).held[0]?.id ?? '');
  await saved(session);
  expect(api.feed.map(({ label }) => label)).toEqual(['Counted 3', 'Drew a room', 'Placed c']);
  expect(api.agreesWith(session.state.document)).toBe(true);
});

test('a device that will not store says so and goes on', async () => {
  const { api, outbox, session } = await start();
  outbox.full = true;
  api.net.goOffline();
  count(session, 3);
  await until(() => {
    expect(saving(session)).toMatchObject({ onDisk: false, unsent: 1 });
  });
  expect(session.state.document.entries.get(A)?.count).toBe(3);
});
