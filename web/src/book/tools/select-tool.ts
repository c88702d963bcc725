import { handlesOf } from '../interaction/handles.ts';
import { hitTest, type Hit } from '../interaction/hit-test.ts';
import { NO_PREVIEW } from '../interaction/preview.ts';
import { sceneOf } from '../interaction/scene.ts';
import type { Selected } from '../session/book-state.ts';
import { dragCorner } from './drags/drag-corner.ts';
import { dragEntries } from './drags/drag-entries.ts';
import { dragMarquee } from './drags/drag-marquee.ts';
import { dragOpening } from './drags/drag-opening.ts';
import { dragView } from './drags/drag-view.ts';
import { dragWall } from './drags/drag-wall.ts';
import type { Drag } from './drags/drag.ts';
import { resizeEntry } from './drags/resize-entry.ts';
import { turnEntry } from './drags/turn-entry.ts';
import { dragStartPx, marginPx, type Tool, type ToolPointer, type ToolPorts } from './tool.ts';

type State =
  | { readonly is: 'idle' }
  | { readonly is: 'pressed'; readonly pressed: ToolPointer; readonly hit: Hit | null; readonly grip: Drag | null }
  | { readonly is: 'dragging'; readonly drag: Drag };

/** Picks things, and moves, resizes and turns what it takes hold of. */
export function selectTool(ports: ToolPorts): Tool {
  const { session, show } = ports;
  let state: State = { is: 'idle' };

  const hitAt = (pointer: ToolPointer): Hit | null => {
    const { document, storeyId, camera } = session.state;
    const scene = storeyId === null ? null : sceneOf(document, storeyId);
    if (scene === null) return null;
    const margin = marginPx(pointer.type) / camera.pxPerM;
    return hitTest(scene, pointer.point, { margin, corners: grippable() })[0] ?? null;
  };

  /** Corners one may take hold of: those of the picked room or wall, and a picked corner. */
  const grippable = (): ReadonlySet<string> => {
    const { document, selection } = session.state;
    return new Set(
      selection.flatMap((picked) => {
        if (picked.kind === 'corner') return [picked.id];
        if (picked.kind === 'wall') return picked.id.split('|');
        const room = picked.kind === 'room' ? document.rooms.get(picked.id) : undefined;
        return room === undefined ? [] : [...room.ring, ...room.holes.flat()];
      }),
    );
  };

  /** A handle of the one picked entry under the pointer. */
  const gripAt = (pointer: ToolPointer): Drag | null => {
    const { document, selection, camera, canEdit } = session.state;
    const [only] = selection;
    if (!canEdit || selection.length !== 1 || only?.kind !== 'entry') return null;
    const entry = document.entries.get(only.id);
    if (entry === undefined) return null;
    const reach = marginPx(pointer.type) + 3;
    const handle = handlesOf(entry, camera.pxPerM).find(
      ({ at }) => Math.hypot(at.x_m - pointer.point.x_m, at.y_m - pointer.point.y_m) * camera.pxPerM <= reach,
    );
    if (handle === undefined) return null;
    return handle.action === 'turn' ? turnEntry(ports, entry) : resizeEntry(ports, entry, handle);
  };

  const dragOf = (pressed: ToolPointer, hit: Hit | null): Drag => {
    const { document, storeyId, canEdit } = session.state;
    const nothing = () => (pressed.type === 'touch' ? dragView(ports, pressed) : dragMarquee(ports, pressed));
    if (hit === null || !canEdit) return nothing();
    switch (hit.kind) {
      case 'entry': {
        if (!isPicked(hit)) session.select(pressed.shift ? [...session.state.selection, hit] : [hit]);
        const held = document.entries.get(hit.id);
        const picked = session.state.selection.flatMap(({ kind, id }) =>
          kind === 'entry' ? (document.entries.get(id) ?? []) : [],
        );
        return held === undefined ? nothing() : dragEntries(ports, held, picked, pressed);
      }
      case 'opening': {
        const opening = document.openings.get(hit.id);
        if (opening === undefined) return nothing();
        session.select([hit]);
        return dragOpening(ports, opening);
      }
      case 'corner': {
        const corner = document.corners.get(hit.id);
        return corner === undefined ? nothing() : dragCorner(ports, corner);
      }
      case 'wall': {
        const wall = storeyId === null ? undefined : sceneOf(document, storeyId)?.walls.find(({ id }) => id === hit.id);
        // Only a wall that is picked, or whose room is, moves: a slip of the hand must not rebuild the house.
        const meant = isPicked(hit) || wall?.roomIds.some((id) => isPicked({ kind: 'room', id }));
        return wall === undefined || storeyId === null || meant !== true
          ? nothing()
          : dragWall(ports, storeyId, wall, pressed);
      }
      case 'room':
        return nothing();
    }
  };

  const isPicked = ({ kind, id }: Selected) =>
    session.state.selection.some((picked) => picked.kind === kind && picked.id === id);

  const pick = (hit: Hit | null, shift: boolean) => {
    const picked = hit === null ? null : { kind: hit.kind, id: hit.id };
    if (!shift) {
      session.select(picked === null ? [] : [picked]);
      return;
    }
    if (picked === null) return;
    const others = session.state.selection.filter((other) => other.kind !== picked.kind || other.id !== picked.id);
    session.select(isPicked(picked) ? others : [...others, picked]);
  };

  return {
    name: 'select',
    state: () => (state.is === 'dragging' ? state.drag.name : state.is),
    down(pointer) {
      const grip = gripAt(pointer);
      state = { is: 'pressed', pressed: pointer, hit: grip === null ? hitAt(pointer) : null, grip };
    },
    move(pointer) {
      if (state.is === 'pressed') {
        const { pressed, hit, grip } = state;
        const moved = Math.hypot(pointer.at.x - pressed.at.x, pointer.at.y - pressed.at.y);
        if (moved < dragStartPx(pointer.type)) return;
        state = { is: 'dragging', drag: grip ?? dragOf(pressed, hit) };
      }
      if (state.is === 'dragging') state.drag.move(pointer);
    },
    up(pointer) {
      const ended = state;
      state = { is: 'idle' };
      if (ended.is === 'pressed' && ended.grip === null) pick(ended.hit, pointer.shift);
      if (ended.is !== 'dragging') return;
      ended.drag.move(pointer);
      show(NO_PREVIEW);
      ended.drag.commit();
    },
    key: () => false,
    cancel() {
      state = { is: 'idle' };
      show(NO_PREVIEW);
    },
  };
}
