import { distanceOf, gapLine } from './gap-line.ts';
import { criticalView, loneFire, type LoneFire } from './lone-fire.ts';
import { clearDistance, squaredDistanceTo, type PlacedRectangle } from './placed-rectangle.ts';
import type { RadiatingFootprint } from './radiation.ts';
import type { SpreadInput } from './simulate-spread.ts';
import {
  answersOf,
  bringsFlashover,
  FARTHEST_M,
  gapViews,
  NO_GAP,
  SAFETY,
  type GapViews,
  type SpreadGap,
} from './spread-gaps.ts';
import { SpreadScene } from './spread-scene.ts';

/** The pairs that stand nearer than what is enough, of all that were looked at. */
export interface ShortGaps {
  /** Ordered pairs within 10 m. */
  readonly pairs: number;
  /** Of these, how many are too near. */
  readonly short: number;
  /** The first of them, largest shortfall first; those that no gap would help come last. */
  readonly gaps: readonly SpreadGap[];
}

interface Candidate {
  readonly from: number;
  readonly to: number;
  readonly gap_m: number;
  /** What it lacks of enough, m; −1 where no gap would help. */
  readonly shortfall: number;
}

const HELPLESS = -1;

/**
 * Of the pairs that `spreadGaps` gives, those that stand nearer than enough or that no gap would help. Most pairs are told
 * to stand far enough apart without working out their gap, and only the rows asked for are worked out in full.
 * @param most rows
 */
export function shortGaps(input: Pick<SpreadInput, 'room' | 'entries' | 'ignition'>, most: number): ShortGaps {
  const scene = new SpreadScene(input.entries, input.room);
  const ignitions = scene.entries.map(({ ignition }) => Object.values(ignition).join());
  const found: Candidate[] = [];
  let pairs = 0;
  for (const from of scene.entries.keys())
    if (scene.canBurn(from)) pairs += lookFrom(scene, from, input.ignition, ignitions, found);
  found.sort((a, b) => b.shortfall - a.shortfall);
  return { pairs, short: found.length, gaps: found.slice(0, most).map(inFullBy(scene, input.ignition, ignitions)) };
}

/** Adds the short pairs of one source; how many pairs it has within 10 m. */
function lookFrom(
  scene: SpreadScene,
  from: number,
  rule: SpreadInput['ignition'],
  ignitions: readonly string[],
  found: Candidate[],
): number {
  const source = scene.source(from);
  const here = scene.footprint(from);
  if (!source || !here) return 0;
  const fire = loneFire(scene, from);
  const flashes = bringsFlashover(scene, fire);
  const known = new Map<string, number>();
  let pairs = 0;
  for (let to = 0; to < scene.entries.length; to += 1) {
    const there = scene.footprint(to);
    if (to === from || !there || !scene.isExposed(to)) continue;
    const centres = Math.hypot(there.x - here.x, there.y - here.y);
    if (centres - circumradius(here) - circumradius(there) > FARTHEST_M) continue;
    if (centres > FARTHEST_M && clearDistance(here, there) > FARTHEST_M) continue;
    pairs += 1;
    if (flashes) {
      found.push({ from, to, gap_m: clearDistance(here, there), shortfall: HELPLESS });
      continue;
    }
    const key = ignitions[to]!;
    let view = known.get(key);
    if (view === undefined) known.set(key, (view = criticalView(fire, scene.entries[to]!.ignition, rule, SAFETY)));
    if (isFarEnough(source, here, there, view)) continue;
    const gap_m = clearDistance(here, there);
    const { metres } = gapLine(source, here, there, view > 0 ? view : Infinity).gapFor(view);
    if (metres === null) found.push({ from, to, gap_m, shortfall: HELPLESS });
    else if (gap_m < metres) found.push({ from, to, gap_m, shortfall: metres - gap_m });
  }
  return pairs;
}

function circumradius({ halfWidth, halfDepth }: PlacedRectangle): number {
  return Math.hypot(halfWidth, halfDepth);
}

/** Whether every cell of the source, wherever it lies in it, is too far off for a view, and stays so farther out. */
function isFarEnough(source: RadiatingFootprint, here: PlacedRectangle, there: PlacedRectangle, view: number): boolean {
  if (view === 0) return false;
  const spread = source.cells.length === 1 ? 0 : circumradius(here);
  return Math.sqrt(squaredDistanceTo(there, here.x, here.y)) - spread > distanceOf(view);
}

/** Works a row out in full; rows of one source share its fire, and of these those that light alike share their views. */
function inFullBy(scene: SpreadScene, rule: SpreadInput['ignition'], ignitions: readonly string[]) {
  const fires = new Map<number, LoneFire>();
  const known = new Map<string, GapViews>();
  return ({ from, to, gap_m }: Candidate): SpreadGap => {
    const fire = fires.get(from) ?? loneFire(scene, from);
    fires.set(from, fire);
    const { id, ignition } = scene.entries[to]!;
    const ids = { from: scene.entries[from]!.id, to: id, gap_m };
    if (bringsFlashover(scene, fire)) return { ...ids, ...NO_GAP };
    const key = `${from} ${ignitions[to]}`;
    const views = known.get(key) ?? gapViews(fire, ignition, rule);
    known.set(key, views);
    return { ...ids, ...answersOf(scene.source(from)!, scene.footprint(from)!, scene.footprint(to)!, views) };
  };
}
