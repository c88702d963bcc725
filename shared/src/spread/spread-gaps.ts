import { gapLine, type Gap } from './gap-line.ts';
import type { Ignition } from './ignition-class.ts';
import { criticalView, loneFire, longExposureView, type LoneFire } from './lone-fire.ts';
import { clearDistance, type PlacedRectangle } from './placed-rectangle.ts';
import type { RadiatingFootprint } from './radiation.ts';
import type { SpreadInput } from './simulate-spread.ts';
import { SpreadScene } from './spread-scene.ts';

/** Pairs farther apart are left out, m. */
export const FARTHEST_M = 10;
/** k_f for what is enough: the point source is used with a safety factor of 2 (SFPE Handbook, from memory). */
export const SAFETY = 2;
const JUST = 1;
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

export type GapAnswers = Omit<SpreadGap, 'from' | 'to' | 'gap_m'>;
export type GapViews = { readonly [K in keyof GapAnswers]: number };

/**
 * The gaps of every ordered pair within 10 m: only the first burns, the second is moved straight away from it along the
 * line of centres (along the first one's depth where the centres are one). Sorted by id.
 */
export function spreadGaps(input: Pick<SpreadInput, 'room' | 'entries' | 'ignition'>): readonly SpreadGap[] {
  const scene = new SpreadScene(input.entries, input.room);
  return scene.entries.flatMap((_, from) => (scene.canBurn(from) ? gapsFrom(scene, from, input.ignition) : []));
}

function gapsFrom(scene: SpreadScene, from: number, rule: SpreadInput['ignition']): SpreadGap[] {
  const source = scene.source(from);
  const here = scene.footprint(from);
  if (!source || !here) return [];
  const fire = loneFire(scene, from);
  const flashes = bringsFlashover(scene, fire);
  const viewsFor = viewsByIgnition(fire, rule);
  const gaps: SpreadGap[] = [];
  for (const [to, entry] of scene.entries.entries()) {
    const there = scene.footprint(to);
    if (to === from || !there || !scene.isExposed(to)) continue;
    const gap_m = clearDistance(here, there);
    if (gap_m > FARTHEST_M) continue;
    const answers = flashes ? NO_GAP : answersOf(source, here, there, viewsFor(entry.ignition));
    gaps.push({ from: scene.entries[from]!.id, to: entry.id, gap_m, ...answers });
  }
  return gaps;
}

/** Whether a lone fire takes the room to flashover, so that no gap helps. */
export function bringsFlashover(scene: SpreadScene, fire: LoneFire): boolean {
  return fire.peak >= (scene.room.flashover_kW ?? Infinity);
}

/** The views that light entries under a lone fire, worked out once for entries that light alike. */
function viewsByIgnition(fire: LoneFire, rule: SpreadInput['ignition']): (ignition: Ignition) => GapViews {
  const known = new Map<string, GapViews>();
  return (ignition) => {
    const key = Object.values(ignition).join();
    const views = known.get(key) ?? gapViews(fire, ignition, rule);
    known.set(key, views);
    return views;
  };
}

const NEVER_FOR_FLASHOVER = { metres: null, never: FLASHOVER_ALONE } as const;
/** The answers where no gap helps because of flashover. */
export const NO_GAP: GapAnswers = {
  justNot: NEVER_FOR_FLASHOVER,
  enough: NEVER_FOR_FLASHOVER,
  longExposureJustNot: NEVER_FOR_FLASHOVER,
  longExposureEnough: NEVER_FOR_FLASHOVER,
};

/** The view that just lights an entry, for each of the answers, 1/m². */
export function gapViews(fire: LoneFire, ignition: Ignition, rule: SpreadInput['ignition']): GapViews {
  return {
    justNot: criticalView(fire, ignition, rule, JUST),
    enough: criticalView(fire, ignition, rule, SAFETY),
    longExposureJustNot: longExposureView(fire, ignition, rule, JUST),
    longExposureEnough: longExposureView(fire, ignition, rule, SAFETY),
  };
}

/** The gaps of one pair for the views that just light the second entry. */
export function answersOf(
  source: RadiatingFootprint,
  here: PlacedRectangle,
  there: PlacedRectangle,
  views: GapViews,
): GapAnswers {
  const line = gapLine(source, here, there, Math.min(...Object.values(views).filter((view) => view > 0)));
  return {
    justNot: line.gapFor(views.justNot),
    enough: line.gapFor(views.enough),
    longExposureJustNot: line.gapFor(views.longExposureJustNot),
    longExposureEnough: line.gapFor(views.longExposureEnough),
  };
}
