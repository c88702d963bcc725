import type { Kind } from '../catalogue/catalogue-row.ts';
import { kindByKey } from '../catalogue/kinds.ts';
import type { RoomInputEntry } from '../tally/room-input.ts';
import type { CountedPart } from '../tally/entry-heats.ts';
import { mostlyFluid } from '../tally/mostly-fluid.ts';
import type { IgnitionClass } from './ignition-class.ts';
import { areaUnder } from './own-curve.ts';
import { poolPeak } from './pool-peak.ts';
import type { SpreadEntry } from './spread-entry.ts';
import { measuredCurve } from './measured-curve.ts';
import type { SpreadDefaultCode } from './spread-defaults.ts';

/** Heat release rate per footprint where nothing else is known, kW/m²; common practice. */
const USUAL_RATE_KW_M2 = 500;
/** Free-burning time where there is no footprint either, s; Law & O'Brien, from memory. */
const FREE_BURNING_S = 1200;
const USUAL_HEIGHT_M = 1;
const USUAL_RADIATIVE_FRACTION = 0.35;
const KJ_PER_MJ = 1000;
/** A curve that holds a thousand times more or less heat than the entry is of something else. */
const MOST_STRETCH = 1000;
/** Within this the curve is taken for the entry’s own without a word. */
const UNSAID_STRETCH = 0.1;

/** What the room has to say about an entry that says nothing itself. */
export interface EntryGiven {
  readonly entry: RoomInputEntry;
  readonly parts: readonly CountedPart[];
  /** MJ, factors in it */
  readonly heat_MJ: number;
  /** kW/s²; for entries without a class of their own. */
  readonly roomAlpha_kW_s2: number;
  readonly alphaOf: (growth: NonNullable<RoomInputEntry['growth']>) => number;
  /** Called for every default that is used. */
  readonly note: (code: SpreadDefaultCode) => void;
}

export function peakOf({ entry, parts, heat_MJ, note }: EntryGiven): number {
  if (entry.peak_kW != null) return entry.peak_kW;
  const area = entry.width_m == null || entry.depth_m == null ? null : entry.width_m * entry.depth_m;
  if (area === null) {
    note('PEAK_FROM_HEAT');
    return (heat_MJ * KJ_PER_MJ) / FREE_BURNING_S;
  }
  const kind = kindOf(entry);
  if (kind?.peak_kW != null) {
    note('PEAK_FROM_KIND');
    return (kind.peak_kW / (kind.width_m * kind.depth_m)) * area;
  }
  const pool = mostlyFluid(parts) ? poolPeak(parts, area) : undefined;
  if (pool !== undefined) {
    note('PEAK_FROM_POOL');
    return pool;
  }
  note('PEAK_FROM_FOOTPRINT');
  return USUAL_RATE_KW_M2 * area;
}

export function growthOf({ entry, heat_MJ, parts, roomAlpha_kW_s2, alphaOf, note }: EntryGiven): SpreadEntry['growth'] {
  if (entry.curve != null) {
    const stretch = (heat_MJ * KJ_PER_MJ) / areaUnder(entry.curve);
    const fits = stretch > 1 / MOST_STRETCH && stretch < MOST_STRETCH;
    if (!fits) note('CURVE_NOT_USED');
    else if (Math.abs(stretch - 1) > UNSAID_STRETCH) note('CURVE_STRETCHED');
    if (fits) return { by: 'measured', points: measuredCurve(entry.curve) };
  }
  if (entry.growth != null) return { by: 't-squared', alpha_kW_s2: alphaOf(entry.growth) };
  if (mostlyFluid(parts)) {
    note('GROWTH_AT_ONCE');
    return { by: 'step' };
  }
  const usual = kindOf(entry)?.growth ?? null;
  note(usual === null ? 'GROWTH_FROM_ROOM' : 'GROWTH_FROM_KIND');
  return { by: 't-squared', alpha_kW_s2: usual === null ? roomAlpha_kW_s2 : alphaOf(usual) };
}

export function ignitionClassOf({ entry, parts, note }: EntryGiven): IgnitionClass {
  if (entry.ignition_class != null) return entry.ignition_class;
  const kind = kindOf(entry);
  if (kind) {
    note('IGNITION_FROM_KIND');
    return kind.ignition_class;
  }
  const [main] = [...parts].sort((a, b) => b.counted - a.counted);
  note(main?.part.material ? 'IGNITION_FROM_MATERIAL' : 'IGNITION_NORMAL');
  return main?.part.material?.ignition_class ?? 'normal';
}

export function radiativeFractionOf({ entry, note }: EntryGiven): number {
  if (entry.radiative_fraction != null) return entry.radiative_fraction;
  const usual = kindOf(entry)?.radiative_fraction ?? null;
  note(usual === null ? 'RADIATIVE_FRACTION_USUAL' : 'RADIATIVE_FRACTION_FROM_KIND');
  return usual ?? USUAL_RADIATIVE_FRACTION;
}

/** Where it stands; a missing footprint is the square that burns at the usual rate per area. */
export function placeOf({ entry, note }: EntryGiven, peak_kW: number): SpreadEntry['place'] {
  const { x_m, y_m, width_m, depth_m, rotation_deg, base_height_m, height_m } = entry;
  if (x_m == null || y_m == null) {
    note('NOT_ON_PLAN');
    return null;
  }
  if (width_m == null || depth_m == null) {
    if (!(peak_kW > 0)) return null;
    note('FOOTPRINT_FROM_PEAK');
  }
  if (height_m == null) note('HEIGHT_USUAL');
  const side = Math.sqrt(peak_kW / USUAL_RATE_KW_M2);
  return {
    x_m,
    y_m,
    width_m: width_m ?? side,
    depth_m: depth_m ?? side,
    rotation_deg: rotation_deg ?? 0,
    base_m: base_height_m ?? 0,
    height_m: height_m ?? USUAL_HEIGHT_M,
  };
}

export function enclosureOf({ entry, note }: EntryGiven): SpreadEntry['enclosure'] {
  if (entry.enclosure !== 'sealed') return entry.enclosure ?? 'open';
  if (entry.sealed_rating_min != null) return 'sealed';
  note('SEAL_NOT_RATED');
  return 'open';
}

function kindOf({ kind }: RoomInputEntry): Kind | undefined {
  return kind == null ? undefined : kindByKey(kind);
}
