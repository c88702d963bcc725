import type { RoomShape } from '../interaction/scene.ts';
import { hatchOf } from './hatch.ts';
import { at, traceRing, type Pen } from './pen.ts';

/** Floors, shaded and hatched by load band. `bandOf` gives null while a room's tally is not known: plain page. */
export function paintRooms(pen: Pen, rooms: readonly RoomShape[], bandOf: (roomId: string) => number | null): void {
  const { context, palette } = pen;
  const origin = at(pen, { x_m: 0, y_m: 0 });
  for (const { room, ring, holes } of rooms) {
    const band = bandOf(room.id);
    context.beginPath();
    traceRing(pen, ring);
    for (const hole of holes) traceRing(pen, hole);
    context.fillStyle = band === null ? palette.page : (palette.load[band] ?? palette.page);
    context.fill('evenodd');
    const hatch = band === null ? null : hatchOf(context, band, palette, origin.x, origin.y);
    if (hatch === null) continue;
    context.fillStyle = hatch;
    context.fill('evenodd');
  }
}
