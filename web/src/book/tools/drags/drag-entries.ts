import { moveEntries } from '@embertally/shared/survey/commands/move-entries';
import { roomAt } from '@embertally/shared/survey/derive/room-at';
import type { Entry } from '@embertally/shared/survey/survey-document';
import { sceneOf } from '../../interaction/scene.ts';
import { snapFootprint } from '../../interaction/snap-footprint.ts';
import { minus, plus } from '../../interaction/vector.ts';
import { snapSettings } from '../snap-targets.ts';
import type { ToolPointer, ToolPorts } from '../tool.ts';
import type { Drag } from './drag.ts';

/**
 * Moves entries together. The moved vector is snapped once, by the entry that was taken hold of, so that distances between
 * them stay. Over a wall they go to that room; onto no room they spring back.
 */
export function dragEntries(
  { session, show }: ToolPorts,
  held: Entry,
  entries: readonly Entry[],
  from: ToolPointer,
): Drag {
  let moved: readonly Entry[] = entries;
  const ids = new Set(entries.map((entry) => entry.id));

  return {
    name: 'moving entries',
    move(pointer) {
      const { document, storeyId } = session.state;
      const scene = storeyId === null ? null : sceneOf(document, storeyId);
      if (scene === null || storeyId === null) return;
      const loose = { ...held, ...plus(held, minus(pointer.point, from.point)) };
      const snapped = snapFootprint(loose, scene, snapSettings(session.state, pointer), ids);
      const by = minus(snapped.centre, held);
      moved = entries.map((entry) => ({ ...entry, ...plus(entry, by) }));
      show({
        entries: moved,
        guides: snapped.guides,
        snap: { at: pointer.point, why: snapped.why },
        unfit: moved.some((entry) => roomAt(document, storeyId, entry) === null),
      });
    },
    commit() {
      const moves = moved.flatMap(({ id, x_m, y_m }, index) =>
        x_m === entries[index]?.x_m && y_m === entries[index].y_m ? [] : [{ entry_id: id, x_m, y_m }],
      );
      if (moves.length === 0) return;
      session.run(moveEntries, { moves }, moves.length === 1 ? `Moved ${held.label}` : `Moved ${moves.length} entries`);
    },
  };
}
