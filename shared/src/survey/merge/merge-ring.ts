/** A stretch of the base ring that one side replaced: positions `from` up to, not including, `to`. */
interface Hunk {
  readonly from: number;
  readonly to: number;
  readonly ids: readonly string[];
}

/**
 * Two changed versions of one ring put together: corners inserted or taken out in different places of the ring.
 *
 * @returns null where both touched the same place in different ways, or one of them turned or reordered the ring
 */
export function mergeRing(
  base: readonly string[],
  theirs: readonly string[],
  mine: readonly string[],
): string[] | null {
  const theirHunks = hunksOf(base, theirs);
  const myHunks = hunksOf(base, mine);
  if (theirHunks === null || myHunks === null) return null;
  const all = [...theirHunks];
  for (const hunk of myHunks) {
    const near = theirHunks.filter((other) => hunk.from <= other.to && other.from <= hunk.to);
    if (near.length === 0) all.push(hunk);
    else if (near.length > 1 || !isSame(near[0] as Hunk, hunk)) return null;
  }
  // The gap before the first corner and the gap after the last are the same wall.
  const first = all.filter((hunk) => hunk.from === 0);
  const last = all.filter((hunk) => hunk.to === base.length);
  if (first.length > 0 && last.length > 0 && !isOneSides(first, last, theirHunks, myHunks)) return null;
  all.sort((a, b) => a.from - b.from);
  const merged: string[] = [];
  let at = 0;
  for (const hunk of all) {
    merged.push(...base.slice(at, hunk.from), ...hunk.ids);
    at = hunk.to;
  }
  merged.push(...base.slice(at));
  return new Set(merged).size === merged.length ? merged : null;
}

function isSame(a: Hunk, b: Hunk): boolean {
  return a.from === b.from && a.to === b.to && a.ids.join() === b.ids.join();
}

function isOneSides(
  first: readonly Hunk[],
  last: readonly Hunk[],
  theirs: readonly Hunk[],
  mine: readonly Hunk[],
): boolean {
  const ends = [...first, ...last];
  return ends.every((hunk) => theirs.includes(hunk)) || ends.every((hunk) => mine.some((own) => isSame(own, hunk)));
}

function hunksOf(base: readonly string[], changed: readonly string[]): Hunk[] | null {
  const position = new Map(base.map((id, index) => [id, index]));
  const hunks: Hunk[] = [];
  let from = 0;
  let ids: string[] = [];
  const close = (to: number): void => {
    if (to > from || ids.length > 0) hunks.push({ from, to, ids });
    ids = [];
  };
  for (const id of changed) {
    const index = position.get(id);
    if (index === undefined) {
      ids.push(id);
      continue;
    }
    if (index < from) return null;
    close(index);
    from = index + 1;
  }
  close(base.length);
  return hunks;
}
