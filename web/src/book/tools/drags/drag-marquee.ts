import { footprint } from '@embertally/shared/geometry/footprint';
import type { Point } from '@embertally/shared/geometry/point';
import { sceneOf } from '../../interaction/scene.ts';
import type { Selected } from '../../session/book-state.ts';
import type { ToolPointer, ToolPorts } from '../tool.ts';
import type { Drag } from './drag.ts';

/** Picks the entries that lie wholly in a rectangle; Shift adds them to what is picked. */
export function dragMarquee({ session, show }: ToolPorts, from: ToolPointer): Drag {
  let to: Point = from.point;
  const before = from.shift ? session.state.selection : [];
  return {
    name: 'picking in a rectangle',
    move(pointer) {
      to = pointer.point;
      show({ marquee: { a: from.point, b: to } });
    },
    commit() {
      const { document, storeyId } = session.state;
      const scene = storeyId === null ? null : sceneOf(document, storeyId);
      const within = (point: Point) =>
        point.x_m >= Math.min(from.point.x_m, to.x_m) &&
        point.x_m <= Math.max(from.point.x_m, to.x_m) &&
        point.y_m >= Math.min(from.point.y_m, to.y_m) &&
        point.y_m <= Math.max(from.point.y_m, to.y_m);
      const found = (scene?.entries ?? []).filter((entry) => footprint(entry).every(within));
      const picked = found.map((entry): Selected => ({ kind: 'entry', id: entry.id }));
      session.select([...before, ...picked.filter(({ id }) => !before.some((other) => other.id === id))]);
    },
  };
}
