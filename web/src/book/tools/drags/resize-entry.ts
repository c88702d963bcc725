import { editEntries } from '@embertally/shared/survey/commands/edit-entries';
import type { Entry } from '@embertally/shared/survey/survey-document';
import type { Handle } from '../../interaction/handles.ts';
import { toGrid } from '../../interaction/snap.ts';
import { minus, plus, turned } from '../../interaction/vector.ts';
import type { ToolPorts } from '../tool.ts';
import type { Drag } from './drag.ts';

const SMALLEST_M = 0.05;

/** Pulls one corner of an entry; the opposite corner stays. Sizes go to the grid unless snapping is let go. */
export function resizeEntry({ session, show }: ToolPorts, entry: Entry, handle: Handle): Drag {
  const still = plus(
    entry,
    turned({ x_m: (-handle.sx * entry.width_m) / 2, y_m: (-handle.sy * entry.depth_m) / 2 }, entry.rotation_deg),
  );
  let sized: Entry = entry;
  return {
    name: 'resizing an entry',
    move(pointer) {
      const across = turned(minus(pointer.point, still), -entry.rotation_deg);
      const size = (along: number) => Math.max(SMALLEST_M, pointer.free ? along : Math.max(0.1, toGrid(along)));
      const width_m = size(across.x_m * handle.sx);
      const depth_m = size(across.y_m * handle.sy);
      const centre = plus(
        still,
        turned({ x_m: (handle.sx * width_m) / 2, y_m: (handle.sy * depth_m) / 2 }, entry.rotation_deg),
      );
      sized = { ...entry, ...centre, width_m, depth_m };
      const corner = plus(still, turned({ x_m: handle.sx * width_m, y_m: 0 }, entry.rotation_deg));
      const opposite = plus(still, turned({ x_m: handle.sx * width_m, y_m: handle.sy * depth_m }, entry.rotation_deg));
      show({
        entries: [sized],
        lengths: [
          { a: still, b: corner },
          { a: corner, b: opposite },
        ],
        snap: { at: pointer.point, why: pointer.free ? null : 'grid' },
      });
    },
    commit() {
      const { id, x_m, y_m, width_m, depth_m } = sized;
      if (width_m === entry.width_m && depth_m === entry.depth_m) return;
      session.run(editEntries, { entry_ids: [id], patch: { x_m, y_m, width_m, depth_m } }, `Resized ${entry.label}`);
    },
  };
}
