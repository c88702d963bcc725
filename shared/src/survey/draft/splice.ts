import { ringEdges } from '../../geometry/ring-edges.ts';
import { wallKey } from '../derive/wall-key.ts';

type Loop = readonly string[];

/**
 * A loop going round the other side of `other` where the two share one unbroken stretch of walls; null where they share
 * none, several, or touch besides. Of a loop and one inside it the difference, of two side by side the union.
 */
export function splice(loop: Loop, other: Loop): string[] | null {
  const walls = new Set(ringEdges(loop).map(([a, b]) => wallKey(a, b)));
  const shared = ringEdges(other).map(([a, b]) => walls.has(wallKey(a, b)));
  const starts = shared.flatMap((is, index) => (is && shared.at(index - 1) === false ? [index] : []));
  const [start] = starts;
  if (start === undefined || starts.length > 1) return null;
  const turned = [...other.slice(start), ...other.slice(0, start)];
  const length = [...shared.slice(start), ...shared.slice(0, start)].indexOf(false) + 1;
  const stretch = turned.slice(0, length);
  const detour = turned.slice(length);
  const visited = new Set(loop);
  if (detour.some((id) => visited.has(id))) return null;
  const dropped = new Set(stretch.slice(1, -1));
  const first = stretch[0] as string;
  const last = stretch.at(-1) as string;
  const kept = loop.filter((id) => !dropped.has(id));
  // After the drop the ends of the stretch are neighbours; the detour goes between them, the way the loop runs.
  const at = kept.indexOf(first);
  const lastFollows = kept[(at + 1) % kept.length] === last && (kept.length > 2 || at === 0);
  const firstFollows = kept[(kept.indexOf(last) + 1) % kept.length] === first;
  if (lastFollows === firstFollows && kept.length > 2) return null;
  if (lastFollows) return insertAfter(kept, at, [...detour].reverse());
  return insertAfter(kept, kept.indexOf(last), detour);
}

function insertAfter(loop: Loop, index: number, ids: readonly string[]): string[] {
  return [...loop.slice(0, index + 1), ...ids, ...loop.slice(index + 1)];
}
