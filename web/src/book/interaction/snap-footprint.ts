import type { Footprint } from '@embertally/shared/geometry/footprint';
import type { Point } from '@embertally/shared/geometry/point';
import { halfExtent } from './footprint-space.ts';
import { toGrid, type Guide, type SnapReason } from './snap.ts';
import type { SnapSettings } from './snap-point.ts';
import type { Scene } from './scene.ts';

export interface SnappedFootprint {
  readonly centre: Point;
  readonly why: SnapReason | null;
  readonly guides: readonly Guide[];
}

interface Edge {
  readonly at: number;
  readonly why: 'wall' | 'in line';
  readonly from: number;
  readonly to: number;
}

/** Entries further away than this do not pull, m. */
const REACH_M = 8;

/**
 * Where a footprint being placed or moved comes to rest: its edges against a wall's face or in line with another entry's
 * edge, else its centre on the grid. Each direction by itself; a footprint turned to an odd angle takes the grid only.
 */
export function snapFootprint(
  footprint: Footprint,
  scene: Scene,
  { threshold, suspended }: SnapSettings,
  moving: ReadonlySet<string>,
): SnappedFootprint {
  const centre = { x_m: footprint.x_m, y_m: footprint.y_m };
  if (suspended) return { centre, why: null, guides: [] };
  const half = halfExtent(footprint);
  const square = Math.abs(footprint.rotation_deg % 90) < 0.01;
  const edges = square ? edgesAround(footprint, half, scene, moving) : { x: [], y: [] };
  const x = pull(centre.x_m, half.x_m, edges.x, threshold);
  const y = pull(centre.y_m, half.y_m, edges.y, threshold);
  const snapped = { x_m: x?.centre ?? toGrid(centre.x_m), y_m: y?.centre ?? toGrid(centre.y_m) };
  const guides: Guide[] = [];
  if (x !== null) guides.push(upright(x.edge, snapped.y_m, half.y_m));
  if (y !== null) guides.push(level(y.edge, snapped.x_m, half.x_m));
  const why = guides.find((guide) => guide.why === 'wall')?.why ?? guides[0]?.why ?? 'grid';
  return { centre: snapped, why, guides };
}

function edgesAround(
  footprint: Footprint,
  half: Point,
  scene: Scene,
  moving: ReadonlySet<string>,
): { x: Edge[]; y: Edge[] } {
  const x: Edge[] = [];
  const y: Edge[] = [];
  const thick = scene.storey.wall_thickness_m / 2;
  for (const { a, b } of scene.walls) {
    const bottom = Math.min(a.y_m, b.y_m);
    const top = Math.max(a.y_m, b.y_m);
    const left = Math.min(a.x_m, b.x_m);
    const right = Math.max(a.x_m, b.x_m);
    if (Math.abs(a.x_m - b.x_m) < 1e-6 && footprint.y_m + half.y_m > bottom && footprint.y_m - half.y_m < top)
      for (const side of [-thick, thick]) x.push({ at: a.x_m + side, why: 'wall', from: bottom, to: top });
    if (Math.abs(a.y_m - b.y_m) < 1e-6 && footprint.x_m + half.x_m > left && footprint.x_m - half.x_m < right)
      for (const side of [-thick, thick]) y.push({ at: a.y_m + side, why: 'wall', from: left, to: right });
  }
  for (const entry of scene.entries) {
    if (moving.has(entry.id)) continue;
    if (Math.abs(entry.x_m - footprint.x_m) > REACH_M || Math.abs(entry.y_m - footprint.y_m) > REACH_M) continue;
    const e = halfExtent(entry);
    for (const side of [-e.x_m, e.x_m])
      x.push({ at: entry.x_m + side, why: 'in line', from: entry.y_m - e.y_m, to: entry.y_m + e.y_m });
    for (const side of [-e.y_m, e.y_m])
      y.push({ at: entry.y_m + side, why: 'in line', from: entry.x_m - e.x_m, to: entry.x_m + e.x_m });
  }
  return { x, y };
}

function pull(centre: number, half: number, edges: readonly Edge[], threshold: number) {
  let best: { centre: number; edge: Edge; distance: number } | null = null;
  for (const edge of edges)
    for (const side of [-half, half]) {
      const distance = Math.abs(centre + side - edge.at);
      if (distance <= threshold && (best === null || distance < best.distance - 1e-9))
        best = { centre: edge.at - side, edge, distance };
    }
  return best;
}

function upright(edge: Edge, centre: number, half: number): Guide {
  const from = Math.min(edge.from, centre - half);
  const to = Math.max(edge.to, centre + half);
  return { a: { x_m: edge.at, y_m: from }, b: { x_m: edge.at, y_m: to }, why: edge.why };
}

function level(edge: Edge, centre: number, half: number): Guide {
  const from = Math.min(edge.from, centre - half);
  const to = Math.max(edge.to, centre + half);
  return { a: { x_m: from, y_m: edge.at }, b: { x_m: to, y_m: edge.at }, why: edge.why };
}
