import { addEntries } from '@embertally/shared/survey/commands/add-entries';
import { deleteRoom } from '@embertally/shared/survey/commands/delete-room';
import { editEntries } from '@embertally/shared/survey/commands/edit-entries';
import { editRoom } from '@embertally/shared/survey/commands/edit-room';
import { moveCorner } from '@embertally/shared/survey/commands/move-corner';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { expect, test } from 'vitest';
import { box, cornerAt, crate, groundFloor, ran, uid, withEntries, withRoom } from '../../../support/survey-builder.ts';
import { openedBook } from '../book-driver.ts';

function store() {
  let document = withRoom(groundFloor(), 'store', box(0, 0, 6, 4));
  document = withRoom(document, 'shop', box(6, 0, 4, 4));
  return withEntries(document, crate('a', 'store', 2, 2), crate('c', 'shop', 8, 2));
}

test('one command is one step and one change set, and undo sends its inverse', () => {
  const { session, queued } = openedBook(store());
  const before = session.state.document;
  session.run(editEntries, { entry_ids: [uid('a')], patch: { count: 3 } }, 'Counted a');
  expect(session.state.document.entries.get(uid('a'))?.count).toBe(3);
  expect(session.state.canUndo).toBe('Counted a');
  session.undo();
  expect([...session.state.document.entries]).toEqual([...before.entries]);
  expect(queued.map(({ label }) => label)).toEqual(['Counted a', 'Undone: Counted a']);
  expect(queued[1]?.changes).toEqual([{ kind: 'entry', id: uid('a'), before: { count: 3 }, after: { count: 1 } }]);
  session.redo();
  expect(session.state.document.entries.get(uid('a'))?.count).toBe(3);
  expect(new Set(queued.map(({ id }) => id)).size).toBe(3);
});

test('a new step after an undo closes the way forward', () => {
  const { session } = openedBook(store());
  session.run(editEntries, { entry_ids: [uid('a')], patch: { count: 3 } }, 'Counted a');
  session.undo();
  session.run(editEntries, { entry_ids: [uid('a')], patch: { count: 5 } }, 'Counted a again');
  expect(session.state.canRedo).toBeNull();
});

test('undo leaves what somebody else has changed since, and names it', () => {
  const { session, queued } = openedBook(store());
  session.run(editEntries, { entry_ids: [uid('a')], patch: { count: 3, label: 'crates' } }, 'Counted a');
  session.receive(ran(session.state.document, editEntries, { entry_ids: [uid('a')], patch: { count: 7 } }));
  session.undo();
  expect(session.state.document.entries.get(uid('a'))).toMatchObject({ count: 7, label: 'a' });
  expect(session.state.message?.text).toMatch(/count/);
  expect(queued[1]?.changes[0]?.after).toEqual({ label: 'a' });
});

test('a refused command changes nothing, is told, and can be told at its field instead', () => {
  const { session, queued } = openedBook(store());
  const { document } = session.state;
  const stray = { entries: [crate('lost', 'store', 50, 50)] };
  const shown = session.run(addEntries, stray, 'Placed');
  expect(shown.refused).toBe(true);
  expect(session.state.message?.kind).toBe('refusal');
  session.say(null);
  session.run(addEntries, stray, 'Placed', { refusal: 'returned' });
  expect(session.state.message).toBeNull();
  expect(session.state.document).toBe(document);
  expect(queued).toEqual([]);
  expect(session.state.canUndo).toBeNull();
});

test('who may only read is told so', () => {
  const { session, queued } = openedBook(store(), { canEdit: false });
  const result = session.run(editRoom, { room_id: uid('store'), patch: { name: 'Dock' } }, 'Renamed');
  expect(result).toMatchObject({ refused: true, code: 'SURVEY_READ_ONLY' });
  expect(queued).toEqual([]);
});

test('what is deleted leaves the selection and the hand', () => {
  const { session } = openedBook(store());
  session.takeRoom(uid('store'));
  session.run(deleteRoom, { room_id: uid('store') }, 'Deleted a room');
  expect(session.state.selection).toEqual([]);
  expect(session.state.roomInHand).toBe(uid('shop'));
  session.undo();
  expect(session.state.selection).toEqual([{ kind: 'room', id: uid('store') }]);
});

test('a tally is recomputed for the room that changed and for no other', () => {
  const { session } = openedBook(store());
  expect(session.tally(uid('store'))).toBeNull();
  const computed: string[] = [];
  session.provideEngine((input) => {
    computed.push(input.room.name);
    return estimateRoom(input);
  });
  const before = { store: session.tally(uid('store')), shop: session.tally(uid('shop')) };
  // 10 kg at 17 MJ/kg on 6 × 4 m of floor
  expect(before.store?.load.total.value).toBeCloseTo(170, 9);
  expect(before.store?.load.perFloor?.value).toBeCloseTo(170 / 24, 9);
  session.run(editEntries, { entry_ids: [uid('a')], patch: { count: 4 } }, 'Counted a');
  expect(session.tally(uid('store'))?.load.total.value).toBeCloseTo(680, 9);
  expect(session.tally(uid('shop'))).toBe(before.shop);
  expect(computed).toEqual(['store', 'shop', 'store']);
});

test('moving the corner between two rooms moves both tallies', () => {
  const { session } = openedBook(store());
  session.provideEngine((input) => estimateRoom(input));
  const shop = session.tally(uid('shop'));
  session.run(moveCorner, { corner_id: cornerAt(session.state.document, 6, 4), x_m: 6, y_m: 5 }, 'Moved a corner');
  // Each room gains a triangle: half its width times 1 m.
  expect(session.tally(uid('store'))?.room.floorArea.value).toBeCloseTo(24 + 3, 9);
  expect(session.tally(uid('shop'))?.room.floorArea.value).toBeCloseTo(16 + 2, 9);
  expect(session.tally(uid('shop'))).not.toBe(shop);
});

test('the Book opens on the storey nearest to level 0', () => {
  const document = groundFloor();
  const [ground] = document.storeys.values();
  if (ground === undefined) throw new Error('no storey');
  const storeys = new Map([
    [uid('attic'), { ...ground, id: uid('attic'), level_m: 6 }],
    [ground.id, ground],
    [uid('cellar'), { ...ground, id: uid('cellar'), level_m: -3 }],
  ]);
  expect(openedBook({ ...document, storeys }).session.state.storeyId).toBe(ground.id);
});

test('readers hear of a change once, and not after they left', () => {
  const { session } = openedBook(store());
  let heard = 0;
  const leave = session.subscribe(() => (heard += 1));
  session.select([{ kind: 'entry', id: uid('a') }]);
  expect(heard).toBe(1);
  leave();
  session.select([]);
  expect(heard).toBe(1);
});

test('taking up another tool lets go of what was picked, keeping the tool does not', () => {
  const { session } = openedBook(store());
  session.select([{ kind: 'entry', id: uid('a') }]);
  session.setTool('contents');
  expect(session.state.selection).toEqual([]);
  session.select([{ kind: 'entry', id: uid('a') }]);
  session.setTool('contents');
  expect(session.state.selection).toHaveLength(1);
  session.setTool('select');
  expect(session.state.selection).toHaveLength(1);
});
