import { editEntries } from '@embertally/shared/survey/commands/edit-entries';
import type { Entry } from '@embertally/shared/survey/survey-document';
import { minus } from '../../interaction/vector.ts';
import type { ToolPorts } from '../tool.ts';
import type { Drag } from './drag.ts';

const STEP_DEG = 15;

/** Turns an entry about its centre, in steps of 15° unless snapping is let go. */
export function turnEntry({ session, show }: ToolPorts, entry: Entry): Drag {
  let turnedEntry: Entry = entry;
  return {
    name: 'turning an entry',
    move(pointer) {
      const way = minus(pointer.point, entry);
      const angle = (Math.atan2(way.y_m, way.x_m) * 180) / Math.PI - 90;
      const stepped = pointer.free ? Math.round(angle * 10) / 10 : Math.round(angle / STEP_DEG) * STEP_DEG;
      const rotation_deg = ((stepped % 360) + 360) % 360;
      turnedEntry = { ...entry, rotation_deg };
      show({ entries: [turnedEntry], typed: { at: pointer.point, text: `${rotation_deg}°` } });
    },
    commit() {
      const { rotation_deg } = turnedEntry;
      if (rotation_deg === entry.rotation_deg) return;
      session.run(
        editEntries,
        { entry_ids: [entry.id], patch: { rotation_deg } },
        `Turned ${entry.label} to ${rotation_deg}°`,
      );
    },
  };
}
