export interface Box {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

export interface PlacedLabel extends Box {
  /** Whether it lies over something and so needs a plate behind it. */
  readonly covers: boolean;
}

/** A label that wants to stand at a line: the places it could take, best first. */
export interface LabelRequest {
  readonly id: string;
  readonly places: readonly Box[];
}

const overlap = (a: Box, b: Box): number =>
  Math.max(0, Math.min(a.x + a.width, b.x + b.width) - Math.max(a.x, b.x)) *
  Math.max(0, Math.min(a.y + a.height, b.y + b.height) - Math.max(a.y, b.y));

/** Length of the part of a segment that runs inside a box (Liang–Barsky). */
function lengthInside(box: Box, x0: number, y0: number, x1: number, y1: number): number {
  let from = 0;
  let to = 1;
  const dx = x1 - x0;
  const dy = y1 - y0;
  const edges: readonly (readonly [number, number])[] = [
    [-dx, x0 - box.x],
    [dx, box.x + box.width - x0],
    [-dy, y0 - box.y],
    [dy, box.y + box.height - y0],
  ];
  for (const [direction, distance] of edges) {
    if (direction === 0) {
      if (distance < 0) return 0;
      continue;
    }
    const t = distance / direction;
    if (direction < 0) from = Math.max(from, t);
    else to = Math.min(to, t);
    if (from > to) return 0;
  }
  return (to - from) * Math.hypot(dx, dy);
}

/**
 * Gives each label the place where it covers least: never another label, and as little of the lines as can be.
 * Deterministic: requests are served in order, ties go to the earlier place.
 *
 * @param lines polylines in px that should stay readable
 */
export function placeLabels(
  requests: readonly LabelRequest[],
  lines: readonly (readonly (readonly [number, number])[])[],
  frame: Box,
): ReadonlyMap<string, PlacedLabel> {
  const taken: Box[] = [];
  const placed = new Map<string, PlacedLabel>();
  for (const request of requests) {
    let best: Box | undefined;
    let bestCost = Infinity;
    for (const place of request.places) {
      let cost = (place.width * place.height - overlap(place, frame)) * 50;
      for (const other of taken) cost += overlap(place, other) * 100;
      for (const line of lines) {
        for (let i = 1; i < line.length; i += 1) {
          const [x0, y0] = line[i - 1] ?? [0, 0];
          const [x1, y1] = line[i] ?? [0, 0];
          cost += lengthInside(place, x0, y0, x1, y1);
        }
      }
      if (cost < bestCost) {
        best = place;
        bestCost = cost;
      }
    }
    if (best === undefined) continue;
    taken.push(best);
    placed.set(request.id, { ...best, covers: bestCost > 0 });
  }
  return placed;
}
