import { addEntries } from '@embertally/shared/survey/commands/add-entries';
import { roomAt } from '@embertally/shared/survey/derive/room-at';
import type { Entry } from '@embertally/shared/survey/survey-document';
import { NO_PREVIEW } from '../interaction/preview.ts';
import { sceneOf } from '../interaction/scene.ts';
import { snapFootprint, type SnappedFootprint } from '../interaction/snap-footprint.ts';
import { snapSettings } from './snap-targets.ts';
import type { Tool, ToolPointer, ToolPorts } from './tool.ts';

const TURN_DEG = 15;
const NOTHING_MOVES: ReadonlySet<string> = new Set();

/** Places contents: the footprint of what was chosen follows the pointer, a press places it; stays in hand until Escape. */
export function contentsTool(ports: ToolPorts): Tool {
  const { session } = ports;
  let pressed = false;
  let turn_deg = 0;
  let last: ToolPointer | null = null;

  const placed = (pointer: ToolPointer): { entry: Entry; snapped: SnappedFootprint; roomId: string | null } | null => {
    const { document, storeyId, placing } = session.state;
    if (storeyId === null || placing.entry === null) return null;
    const scene = sceneOf(document, storeyId);
    if (scene === null) return null;
    const rotation_deg = (placing.entry.rotation_deg + turn_deg) % 360;
    const loose = { ...placing.entry, ...pointer.point, rotation_deg };
    const snapped = snapFootprint(loose, scene, snapSettings(session.state, pointer), NOTHING_MOVES);
    const roomId = roomAt(document, storeyId, snapped.centre)?.id ?? null;
    return { entry: { ...loose, x_m: snapped.centre.x_m, y_m: snapped.centre.y_m }, snapped, roomId };
  };

  const follow = (pointer: ToolPointer) => {
    last = pointer;
    const place = placed(pointer);
    if (place === null) {
      ports.show(NO_PREVIEW);
      return;
    }
    const { entry, snapped, roomId } = place;
    ports.show({
      ghost: entry,
      guides: snapped.guides,
      snap: { at: pointer.point, why: snapped.why },
      unfit: roomId === null,
    });
  };

  return {
    name: 'contents',
    state: () => (pressed ? 'pressed' : 'idle'),
    down(pointer) {
      pressed = true;
      follow(pointer);
    },
    move: follow,
    up(pointer) {
      if (!pressed) return;
      pressed = false;
      const place = placed(pointer);
      if (place === null) {
        session.say({ kind: 'notice', text: 'Choose what to place first: type two letters of a kind or material.' });
        return;
      }
      if (place.roomId === null) {
        session.say({ kind: 'refusal', text: 'Contents stand in a room. Press inside one.' });
        return;
      }
      const entry: Entry = {
        ...place.entry,
        id: session.newId(),
        room_id: place.roomId,
        recorded_by: session.person,
        recorded_at: session.now(),
      };
      const result = session.run(addEntries, { entries: [entry] }, `Placed ${entry.label}`);
      if (!result.refused) session.select([{ kind: 'entry', id: entry.id }]);
      if (pointer.type === 'touch') ports.show(NO_PREVIEW);
    },
    key({ key, shift }) {
      const step = { '[': TURN_DEG, ']': -TURN_DEG, '{': 90, '}': -90 }[key];
      if (step === undefined) return false;
      turn_deg = (turn_deg + (shift ? Math.sign(step) * 90 : step)) % 360;
      if (last !== null) follow(last);
      return true;
    },
    cancel() {
      pressed = false;
      ports.show(NO_PREVIEW);
    },
  };
}
