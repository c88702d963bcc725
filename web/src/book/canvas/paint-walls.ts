import type { RoomShape } from '../interaction/scene.ts';
import { CASING_PX, traceRing, type Pen } from './pen.ts';

const THINNEST_PX = 3;

export function wallWidth_px(pen: Pen, thickness_m: number): number {
  return Math.max(THINNEST_PX, thickness_m * pen.camera.pxPerM);
}

/** Walls in ink with a casing, so that they stand out on every band. All casings first: corners then join cleanly. */
export function paintWalls(pen: Pen, rooms: readonly RoomShape[], thickness_m: number): void {
  const { context, palette } = pen;
  const width = wallWidth_px(pen, thickness_m);
  context.lineJoin = 'miter';
  context.beginPath();
  for (const { ring, holes } of rooms) {
    traceRing(pen, ring);
    for (const hole of holes) traceRing(pen, hole);
  }
  context.strokeStyle = palette.page;
  context.lineWidth = width + 2 * CASING_PX;
  context.stroke();
  context.strokeStyle = palette.ink;
  context.lineWidth = width;
  context.stroke();
}
