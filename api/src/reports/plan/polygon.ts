import type { Point } from '../pdf/sheet.ts';

export interface Rect {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** True when a point lies inside the rings (inside an inner ring is outside). */
export function insideRings([x, y]: Point, rings: readonly (readonly Point[])[]): boolean {
  let inside = false;
  for (const ring of rings) {
    for (let at = 0, before = ring.length - 1; at < ring.length; before = at++) {
      const [ax, ay] = ring[at] ?? [0, 0];
      const [bx, by] = ring[before] ?? [0, 0];
      if (ay > y !== by > y && x < ((bx - ax) * (y - ay)) / (by - ay) + ax) inside = !inside;
    }
  }
  return inside;
}

/** True when the segment touches the rectangle. */
export function segmentTouches([ax, ay]: Point, [bx, by]: Point, rect: Rect): boolean {
  let [from, to] = [0, 1];
  const clip = (delta: number, distance: number) => {
    if (delta === 0) return distance >= 0;
    const share = distance / delta;
    if (delta < 0) from = Math.max(from, share);
    else to = Math.min(to, share);
    return from <= to;
  };
  const [dx, dy] = [bx - ax, by - ay];
  return (
    clip(-dx, ax - rect.x) &&
    clip(dx, rect.x + rect.width - ax) &&
    clip(-dy, ay - rect.y) &&
    clip(dy, rect.y + rect.height - ay)
  );
}

/** True when a rectangle and a polygon share any place. */
export function rectMeetsPolygon(rect: Rect, polygon: readonly Point[]): boolean {
  for (let at = 0, before = polygon.length - 1; at < polygon.length; before = at++) {
    if (segmentTouches(polygon[before] ?? [0, 0], polygon[at] ?? [0, 0], rect)) return true;
  }
  return insideRings([rect.x, rect.y], [polygon]);
}

/** True when two rectangles overlap by more than an edge. */
export function rectsOverlap(a: Rect, b: Rect): boolean {
  return a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height;
}
