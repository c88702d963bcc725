import { bounds } from '@embertally/shared/geometry/bounds';
import { footprint } from '@embertally/shared/geometry/footprint';
import { fitted } from '../interaction/camera.ts';
import { sceneOf } from '../interaction/scene.ts';
import type { BookSession } from '../session/book-session.ts';

const WIDEST_MARGIN_PX = 56;
const EMPTY_STOREY = [
  { x_m: 0, y_m: 0 },
  { x_m: 12, y_m: 8 },
];

/** Shows one room, or the whole storey, as large as it fits. An empty storey shows 12 × 8 m to draw on. */
export function fitView(session: BookSession, what: 'room' | 'storey'): void {
  const { document, storeyId, roomInHand, view } = session.state;
  const scene = storeyId === null ? null : sceneOf(document, storeyId);
  const rooms = scene?.rooms ?? [];
  const chosen = what === 'room' ? rooms.filter(({ room }) => room.id === roomInHand) : rooms;
  const points = [
    ...chosen.flatMap(({ ring }) => ring),
    ...(what === 'storey' ? (scene?.entries ?? []).flatMap((entry) => footprint(entry)) : []),
  ];
  session.setCamera(
    fitted(bounds(points.length === 0 ? EMPTY_STOREY : points), view, Math.min(WIDEST_MARGIN_PX, view.width * 0.08)),
  );
}
