import { roomsOfStorey } from '@embertally/shared/survey/derive/rooms-of-storey';
import { entriesOfRoom } from '@embertally/shared/survey/derive/entries-of-room';
import type { BookState, Selected, ToolName } from '../session/book-state.ts';
import type { Action } from './action.ts';
import { duplicatePicked, pasteCopied } from './copy-picked.ts';
import { deletePicked } from './delete-picked.ts';
import { fitView } from './fit-view.ts';
import { nudge } from './nudge.ts';

const always = () => true;
const canEdit = (state: BookState) => state.canEdit;
const entryPicked = (state: BookState) => state.canEdit && state.selection.some(({ kind }) => kind === 'entry');
const anyPicked = (state: BookState) => state.canEdit && state.selection.length > 0;
const hasRoom = (state: BookState) => state.roomInHand !== null;

function tool(
  name: Exclude<ToolName, 'select'>,
  label: string,
  key: string,
  isAvailable: Action['isAvailable'],
): Action {
  return {
    id: name,
    label,
    keys: [key],
    group: 'draw',
    edits: name !== 'measure',
    isAvailable,
    isOn: (state) => state.tool === name,
    run: ({ session }) => {
      session.setTool(session.state.tool === name ? 'select' : name);
    },
  };
}

function step(key: string, dx: number, dy: number): readonly Action[] {
  const sizes = [
    ['', 0.1, '0.1 m'],
    ['Shift+', 1, '1 m'],
    ['Alt+', 0.001, '1 mm'],
  ] as const;
  return sizes.map(([held, size_m, words]) => ({
    id: `nudge ${held}${key}`,
    label: `Move what is picked ${words}`,
    keys: [held + key],
    group: 'change' as const,
    isAvailable: anyPicked,
    run: ({ session }) => {
      nudge(session, dx * size_m, dy * size_m);
    },
  }));
}

/** The verbs above the plan, in order. */
export const TOOL_ACTIONS: readonly Action[] = [
  tool('draw-room', 'Draw room', 'R', canEdit),
  tool('opening', 'Opening', 'O', (state) => state.canEdit && state.document.rooms.size > 0),
  tool('contents', 'Place contents', 'C', (state) => state.canEdit && state.document.rooms.size > 0),
  tool('measure', 'Measure', 'M', always),
];

export const HISTORY_ACTIONS: readonly Action[] = [
  {
    id: 'undo',
    edits: true,
    label: 'Undo',
    keys: ['Control+Z'],
    group: 'change',
    isAvailable: (state) => state.canUndo !== null,
    run: ({ session }) => {
      session.undo();
    },
  },
  {
    id: 'redo',
    edits: true,
    label: 'Redo',
    keys: ['Control+Shift+Z', 'Control+Y'],
    group: 'change',
    isAvailable: (state) => state.canRedo !== null,
    run: ({ session }) => {
      session.redo();
    },
  },
];

/** The way to everything without the plan. */
export const TABLE_ACTIONS: readonly Action[] = [
  {
    id: 'tables',
    label: 'Tables',
    keys: ['T'],
    group: 'look',
    isAvailable: always,
    run: ({ session }) => {
      session.showTables(true);
    },
  },
];

export const FIT_ACTIONS: readonly Action[] = [
  {
    id: 'fit-room',
    label: 'Fit room',
    keys: ['F'],
    group: 'look',
    isAvailable: hasRoom,
    run: ({ session }) => {
      fitView(session, 'room');
    },
  },
  {
    id: 'fit-storey',
    label: 'Fit storey',
    keys: ['Shift+F'],
    group: 'look',
    isAvailable: always,
    run: ({ session }) => {
      fitView(session, 'storey');
    },
  },
];

const OTHER_ACTIONS: readonly Action[] = [
  tool('split-room', 'Split a room', 'S', (state) => state.canEdit && state.document.rooms.size > 0),
  {
    id: 'duplicate',
    label: 'Duplicate',
    keys: ['Control+D'],
    group: 'change',
    isAvailable: entryPicked,
    run: ({ session }) => {
      duplicatePicked(session);
    },
  },
  {
    id: 'copy',
    label: 'Copy',
    keys: ['Control+C'],
    group: 'change',
    isAvailable: (state) => state.selection.some(({ kind }) => kind === 'entry'),
    run: ({ session }) => {
      session.copy();
      session.announce('Copied');
    },
  },
  {
    id: 'paste',
    label: 'Paste',
    keys: ['Control+V'],
    group: 'change',
    isAvailable: (state) => state.canEdit && state.clipboard.length > 0,
    run: ({ session }) => {
      pasteCopied(session);
    },
  },
  {
    id: 'delete',
    label: 'Delete',
    keys: ['Delete', 'Backspace'],
    group: 'change',
    isAvailable: anyPicked,
    run: ({ session }) => {
      deletePicked(session);
    },
  },
  {
    id: 'pick-all',
    label: 'Pick all contents of the storey',
    keys: ['Control+A'],
    group: 'look',
    isAvailable: always,
    run: ({ session }) => {
      const { document, storeyId } = session.state;
      const rooms = storeyId === null ? [] : roomsOfStorey(document, storeyId);
      const entries = rooms.flatMap((room) => entriesOfRoom(document, room.id));
      session.select(entries.map(({ id }): Selected => ({ kind: 'entry', id })));
    },
  },
  zoom('zoom-in', 'Zoom in', ['+', '='], 1.25),
  zoom('zoom-out', 'Zoom out', ['-'], 0.8),
  ...step('ArrowLeft', -1, 0),
  ...step('ArrowRight', 1, 0),
  ...step('ArrowUp', 0, 1),
  ...step('ArrowDown', 0, -1),
];

function zoom(id: string, label: string, keys: readonly string[], factor: number): Action {
  return {
    id,
    label,
    keys,
    group: 'look',
    isAvailable: always,
    run: ({ session, host }) => {
      const { view } = session.state;
      host.zoomAt({ x: view.width / 2, y: view.height / 2 }, factor);
    },
  };
}

/** Everything that has a key. */
export const ALL_ACTIONS: readonly Action[] = [
  ...TOOL_ACTIONS,
  ...HISTORY_ACTIONS,
  ...TABLE_ACTIONS,
  ...FIT_ACTIONS,
  ...OTHER_ACTIONS,
];
