import { spreadInput } from '../spread/spread-input.ts';
import type { FurtherGiven } from './further-reading.ts';

/** One entry burning at its peak. */
export interface StrongestFire {
  readonly label: string;
  /** kW, and where it came from. */
  readonly Q: number;
  readonly isStated: boolean;
  /** Diameter of a round fire as large as the footprint, m. */
  readonly D: number;
  /** m² */
  readonly area: number;
  readonly base_m: number;
  readonly radiativeFraction: number;
}

/** The open entry with the highest peak among those with a footprint; its peak as `spread` takes it. */
export function strongestFire({ input, basis }: FurtherGiven): StrongestFire | undefined {
  const burning = spreadInput({ ...basis, oxygenLimitedHeat_MJ: null }).input.entries;
  let found: StrongestFire | undefined;
  for (const [index, entry] of input.contents.entries()) {
    const one = burning[index];
    const area = (entry.width_m ?? 0) * (entry.depth_m ?? 0);
    if (!one || one.enclosure !== 'open' || !(one.heat_MJ > 0) || !(area > 0)) continue;
    if (found && found.Q >= one.peak_kW) continue;
    found = {
      label: entry.label ?? entry.id,
      Q: one.peak_kW,
      isStated: entry.peak_kW != null || entry.curve != null,
      D: Math.sqrt((4 * area) / Math.PI),
      area,
      base_m: entry.base_height_m ?? 0,
      radiativeFraction: one.radiativeFraction,
    };
  }
  return found;
}

/** The origin of its peak, for workings. */
export function peakOrigin({ isStated, label }: StrongestFire) {
  return isStated
    ? ({ origin: 'given', note: `peak of ${label}` } as const)
    : ({ origin: 'default', note: `peak of ${label}, from its kind or footprint` } as const);
}
