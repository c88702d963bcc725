import type { Point, Region } from './point.ts';
import { ringEdges } from './ring-edges.ts';

/**
 * A place well inside a region: the middle of the widest stretch of floor on one of a few level lines. Good enough to
 * put a label or a first entry; null only for a region without floor.
 */
export function interiorPoint(region: Region): Point | null {
  const heights = [...new Set([region.ring, ...region.holes].flat().map((point) => point.y_m))].sort((a, b) => a - b);
  const levels = heights.slice(1).map((height, index) => (height + (heights[index] as number)) / 2);
  const lowest = heights[0] ?? 0;
  const highest = heights.at(-1) ?? 0;
  levels.push((lowest + highest) / 2 + (highest - lowest) * 1e-4);
  let best: { point: Point; score: number } | null = null;
  for (const y_m of levels) {
    const crossings = [region.ring, ...region.holes]
      .flatMap((loop) => ringEdges(loop))
      .filter(([a, b]) => a.y_m > y_m !== b.y_m > y_m)
      .map(([a, b]) => a.x_m + ((y_m - a.y_m) / (b.y_m - a.y_m)) * (b.x_m - a.x_m))
      .sort((a, b) => a - b);
    for (let index = 0; index + 1 < crossings.length; index += 2) {
      const from = crossings[index] as number;
      const to = crossings[index + 1] as number;
      const room = Math.min(...heights.map((height) => Math.abs(height - y_m)));
      const score = Math.min(to - from, 4 * room);
      if (to > from && (best === null || score > best.score)) best = { point: { x_m: (from + to) / 2, y_m }, score };
    }
  }
  return best?.point ?? null;
}
