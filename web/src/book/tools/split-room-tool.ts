import type { Point } from '@embertally/shared/geometry/point';
import { pointInRing } from '@embertally/shared/geometry/point-in-ring';
import { splitRoom } from '@embertally/shared/survey/commands/split-room';
import { roomAt } from '@embertally/shared/survey/derive/room-at';
import { roomRegion } from '@embertally/shared/survey/derive/room-region';
import type { Room } from '@embertally/shared/survey/survey-document';
import { NO_PREVIEW } from '../interaction/preview.ts';
import { sceneOf } from '../interaction/scene.ts';
import { snapPoint } from '../interaction/snap-point.ts';
import type { Snapped } from '../interaction/snap.ts';
import { middle } from '../interaction/vector.ts';
import { snapSettings, snapTargets } from './snap-targets.ts';
import type { Tool, ToolKey, ToolPointer, ToolPorts } from './tool.ts';

type State = { readonly is: 'idle' } | { readonly is: 'wall'; readonly points: readonly Point[]; readonly next: Point };

/**
 * Parts a room by a new wall: press on a wall of it, corner by corner across the floor, and on another wall, which ends it.
 * Which room is parted follows from where the new wall runs.
 */
export function splitRoomTool(ports: ToolPorts): Tool {
  const { session } = ports;
  let state: State = { is: 'idle' };

  const snap = (pointer: ToolPointer): Snapped => {
    const { document, storeyId } = session.state;
    const scene = storeyId === null ? null : sceneOf(document, storeyId);
    const drawn = state.is === 'wall' ? state.points : [];
    return snapPoint(
      pointer.point,
      scene === null ? { corners: [], walls: [], drawn } : snapTargets(scene, drawn),
      snapSettings(session.state, pointer),
    );
  };

  const become = (next: State, snapped: Snapped | null = null) => {
    state = next;
    if (next.is === 'idle') {
      ports.show(NO_PREVIEW);
      return;
    }
    const { points, next: to } = next;
    const last = points.at(-1);
    ports.show({
      drawing: { points, next: to, closes: false },
      ...(last === undefined ? {} : { lengths: [{ a: last, b: to }] }),
      ...(snapped === null ? {} : { guides: snapped.guides, snap: { at: snapped.point, why: snapped.why } }),
    });
  };

  /** The room the first stretch of the new wall runs through. */
  const roomOf = ([first, second]: readonly Point[]): Room | null => {
    const { document, storeyId } = session.state;
    if (storeyId === null || first === undefined || second === undefined) return null;
    return roomAt(document, storeyId, middle(first, second));
  };

  const endsOnWall = (points: readonly Point[]): boolean => {
    const room = roomOf(points);
    const region = room && roomRegion(session.state.document.corners, room);
    const last = points.at(-1);
    return region != null && last !== undefined && pointInRing(last, region.ring) === 'on';
  };

  const commit = (points: readonly Point[]): void => {
    const room = roomOf(points);
    become({ is: 'idle' });
    if (room === null) {
      session.say({ kind: 'refusal', text: 'Begin on a wall of the room that is to be split.' });
      return;
    }
    const new_room_id = session.newId();
    const corner_ids = points.map(() => session.newId());
    const result = session.run(splitRoom, { room_id: room.id, new_room_id, points, corner_ids }, `Split ${room.name}`);
    if (result.refused) return;
    session.setTool('select');
    session.select([{ kind: 'room', id: new_room_id }]);
  };

  const press = (at: Point): void => {
    if (state.is === 'idle') {
      become({ is: 'wall', points: [at], next: at });
      session.announce('The new wall begins here');
      return;
    }
    const last = state.points.at(-1);
    if (last !== undefined && Math.hypot(at.x_m - last.x_m, at.y_m - last.y_m) < 0.0005) return;
    const points = [...state.points, at];
    if (endsOnWall(points)) commit(points);
    else become({ is: 'wall', points, next: at });
  };

  return {
    name: 'split-room',
    state: () => state.is,
    down: () => undefined,
    move(pointer) {
      const snapped = snap(pointer);
      if (state.is === 'idle') ports.show({ guides: snapped.guides, snap: { at: snapped.point, why: snapped.why } });
      else become({ ...state, next: snapped.point }, snapped);
    },
    up(pointer) {
      press(snap(pointer).point);
    },
    key({ key }: ToolKey) {
      if (state.is === 'idle' || key !== 'Backspace') return false;
      const points = state.points.slice(0, -1);
      become(points.length === 0 ? { is: 'idle' } : { ...state, points });
      return true;
    },
    cancel() {
      become({ is: 'idle' });
    },
  };
}
