import { criticalView, loneFire, longExposureView, type LoneFire } from './lone-fire.ts';
import { clearDistance, squaredDistanceTo, type PlacedRectangle } from './placed-rectangle.ts';
import { viewFactor, type RadiatingFootprint } from './radiation.ts';
import type { SpreadInput } from './simulate-spread.ts';
import { SpreadScene } from './spread-scene.ts';

/** Pairs farther apart are left out, m. */
const FARTHEST_M = 10;
/** k_f for what is enough: the point source is used with a safety factor of 2 (SFPE Handbook, from memory). */
const SAFETY = 2;
const JUST = 1;
/** m */
const FINE = 0.001;
const GRID = 10;
const MOST_TRIES = 60;

/** A distance, or why none keeps the fire away. */
export type Gap =
  { readonly metres: number; readonly never?: undefined } | { readonly metres: null; readonly never: string };

export const LAYER_ALONE = 'The hot layer alone would light it.';
export const FLASHOVER_ALONE = 'This entry alone would take the room to flashover.';

/** What distance keeps one entry from lighting another, clear between their footprints on the plan. */
export interface SpreadGap {
  readonly from: string;
  readonly to: string;
  /** As they stand, m. */
  readonly gap_m: number;
  /** Just not lit, by this model. */
  readonly justNot: Gap;
  /** Not lit by twice the radiation. */
  readonly enough: Gap;
  /** Not lit however long it burned at its peak, by once and by twice the radiation. */
  readonly longExposureJustNot: Gap;
  readonly longExposureEnough: Gap;
}

type Place = PlacedRectangle;
type Answers = Omit<SpreadGap, 'from' | 'to' | 'gap_m'>;
type Views = { readonly [K in keyof Answers]: number };

/** The pairs that stand nearer than what is enough, of all that were looked at. */
export interface ShortGaps {
  /** Ordered pairs within 10 m. */
  readonly pairs: number;
  readonly gaps: readonly SpreadGap[];
}

/** The gaps of `spreadGaps` that are smaller than enough, or where no gap would help; the others are counted only. */
export function shortGaps(input: Pick<SpreadInput, 'room' | 'entries' | 'ignition'>): ShortGaps {
  const scene = new SpreadScene(input.entries, input.room);
  const found = { pairs: 0, gaps: [] as SpreadGap[] };
  for (const from of scene.entries.keys()) {
    if (!scene.canBurn(from)) continue;
    for (const gap of gapsFrom(scene, from, input.ignition, found)) if (isShort(gap)) found.gaps.push(gap);
  }
  return found;
}

function isShort({ gap_m, enough }: SpreadGap): boolean {
  return enough.metres === null || gap_m < enough.metres;
}

/**
 * The gaps of every ordered pair within 10 m: only the first burns, the second is moved straight away from it along the
 * line of centres (along the first one's depth where the centres are one). Sorted by id.
 */
export function spreadGaps(input: Pick<SpreadInput, 'room' | 'entries' | 'ignition'>): readonly SpreadGap[] {
  const scene = new SpreadScene(input.entries, input.room);
  return scene.entries.flatMap((_, from) => (scene.canBurn(from) ? gapsFrom(scene, from, input.ignition) : []));
}

/** @param counted counts every pair and leaves out those that plainly stand far enough apart */
function gapsFrom(
  scene: SpreadScene,
  from: number,
  rule: SpreadInput['ignition'],
  counted?: { pairs: number },
): SpreadGap[] {
  const source = scene.source(from);
  const here = scene.footprint(from);
  if (!source || !here) return [];
  const fire = loneFire(scene, from);
  const flashes = fire.peak >= (scene.room.flashover_kW ?? Infinity);
  const known = new Map<string, Views>();
  const gaps: SpreadGap[] = [];
  for (const [to, entry] of scene.entries.entries()) {
    const there = scene.footprint(to);
    if (to === from || !there || !scene.isExposed(to)) continue;
    const gap_m = clearDistance(here, there);
    if (gap_m > FARTHEST_M) continue;
    const key = Object.values(entry.ignition).join();
    const views = known.get(key) ?? viewsOf(fire, entry.ignition, rule);
    known.set(key, views);
    if (counted) {
      counted.pairs += 1;
      if (!flashes && isFarEnough(source, here, there, views.enough)) continue;
    }
    const answers = flashes ? ALL_FLASHOVER : answersOf(source, here, there, views);
    gaps.push({ from: scene.entries[from]!.id, to: entry.id, gap_m, ...answers });
  }
  return gaps;
}

/** Whether every cell of the source, wherever it lies in it, is too far off for a view, and stays so farther out. */
function isFarEnough(source: RadiatingFootprint, here: Place, there: Place, view: number): boolean {
  if (view === 0) return false;
  const spread = source.cells.length === 1 ? 0 : Math.hypot(here.halfWidth, here.halfDepth);
  return Math.sqrt(squaredDistanceTo(there, here.x, here.y)) - spread > distanceOf(view);
}

const NEVER_FOR_FLASHOVER = { metres: null, never: FLASHOVER_ALONE } as const;
const ALL_FLASHOVER: Answers = {
  justNot: NEVER_FOR_FLASHOVER,
  enough: NEVER_FOR_FLASHOVER,
  longExposureJustNot: NEVER_FOR_FLASHOVER,
  longExposureEnough: NEVER_FOR_FLASHOVER,
};

function viewsOf(fire: LoneFire, ignition: Parameters<typeof criticalView>[1], rule: SpreadInput['ignition']): Views {
  return {
    justNot: criticalView(fire, ignition, rule, JUST),
    enough: criticalView(fire, ignition, rule, SAFETY),
    longExposureJustNot: longExposureView(fire, ignition, rule, JUST),
    longExposureEnough: longExposureView(fire, ignition, rule, SAFETY),
  };
}

function answersOf(source: RadiatingFootprint, here: Place, there: Place, views: Views): Answers {
  const line = lineOf(source, here, there, views);
  return {
    justNot: line.gapFor(views.justNot),
    enough: line.gapFor(views.enough),
    longExposureJustNot: line.gapFor(views.longExposureJustNot),
    longExposureEnough: line.gapFor(views.longExposureEnough),
  };
}

/** The second entry moved along the line of centres, seen from the first. */
function lineOf(source: RadiatingFootprint, here: Place, there: Place, views: Views) {
  const apart = Math.hypot(there.x - here.x, there.y - here.y);
  const [x, y] = apart > FINE ? [(there.x - here.x) / apart, (there.y - here.y) / apart] : [-here.sin, here.cos];
  const moved = { ...there };
  const moveTo = (centres: number): Place => {
    moved.x = here.x + x * centres;
    moved.y = here.y + y * centres;
    return moved;
  };
  /** Distance of a single point with the same view: nearly a straight line over the distance of centres. */
  const distanceAt = (centres: number) => distanceOf(viewFactor(source, moveTo(centres)));
  const smallest = Math.min(...Object.values(views).filter((view) => view > 0));
  const reach = Math.hypot(here.halfWidth, here.halfDepth) + Math.hypot(there.halfWidth, there.halfDepth);
  const farthest = Number.isFinite(smallest) ? distanceOf(smallest) + reach + FINE : 0;
  const grid = source.cells.length === 1 ? 1 : GRID;
  const seen = Array.from({ length: farthest > 0 ? grid + 1 : 0 }, (_, k) => distanceAt((farthest * k) / grid));

  /** The outermost place from which on the view is less; past a long source the view may rise before it falls. */
  function gapFor(view: number): Gap {
    if (view === 0) return { metres: null, never: LAYER_ALONE };
    const wanted = distanceOf(view);
    const inside = seen.findLastIndex((at) => at <= wanted);
    if (inside < 0 || inside === grid) return { metres: 0 };
    const [low, high] = [(farthest * inside) / grid, (farthest * (inside + 1)) / grid];
    const off = [seen[inside]! - wanted, seen[inside + 1]! - wanted] as const;
    return { metres: clearDistance(here, moveTo(rootBetween((c) => distanceAt(c) - wanted, low, high, ...off))) };
  }
  return { gapFor };
}

function distanceOf(view: number): number {
  return 1 / Math.sqrt(4 * Math.PI * view);
}

/** Where a rising function passes 0, from its values at both ends; regula falsi after Dowell & Jarratt (Illinois). */
function rootBetween(f: (x: number) => number, low: number, high: number, atLow: number, atHigh: number): number {
  let side = 0;
  for (let i = 0; i < MOST_TRIES && high - low > FINE / 2; i += 1) {
    const x = (low * atHigh - high * atLow) / (atHigh - atLow);
    const value = f(x);
    if (Math.abs(value) < FINE / 10) return x;
    if (value > 0) {
      [high, atHigh] = [x, value];
      if (side === 1) atLow /= 2;
      side = 1;
    } else {
      [low, atLow] = [x, value];
      if (side === -1) atHigh /= 2;
      side = -1;
    }
  }
  return high;
}
