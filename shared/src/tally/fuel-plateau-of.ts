import { useByKey } from '../catalogue/uses.ts';
import { estimate, type Estimate } from '../methods/estimate.ts';
import { fuelPlateau, sumOfPeaks } from '../methods/growth/fuel-plateau.ts';
import type { EntryHeat } from './entry-heats.ts';
import type { RoomAreas } from './room-areas.ts';
import type { RoomInput } from './room-input.ts';
import { noteMissing, type TallyContext } from './tally-context.ts';

/** Footprints that cover less than this share of the floor make a localised fire, not one of the whole floor. */
const LOCALISED_BELOW = 0.25;

/**
 * What the fuel can feed: rate per area × fire area, not above the peaks of the entries when every one is known; for a
 * localised fire the peaks, or the rate per area × the footprints.
 */
export function fuelPlateauOf(
  input: RoomInput,
  areas: RoomAreas,
  heats: readonly EntryHeat[],
  context: TallyContext,
): Estimate | undefined {
  const { workings } = context;
  const burning = heats.filter(({ counted }) => counted > 0).map(({ entry }) => entry);
  const known = burning.map((entry) =>
    entry.curve == null ? (entry.peak_kW ?? null) : entry.curve.reduce((peak, [, kW]) => Math.max(peak, kW), 0),
  );
  const peaks = known.every((peak) => peak !== null) ? known : [];
  const footprints = burning.map(({ width_m, depth_m }) =>
    width_m == null || depth_m == null ? null : width_m * depth_m,
  );
  const covered = footprints.reduce<number | null>(
    (sum, area) => (sum === null || area === null ? null : sum + area),
    0,
  );
  const fireArea = input.options?.fire_area_m2 ?? null;
  const localised =
    fireArea === null && burning.length > 0 && covered !== null && covered < LOCALISED_BELOW * areas.floor;
  const use = input.room.use == null ? undefined : useByKey(input.room.use);
  const stated = input.options?.plateau_kW_m2 ?? null;
  const rate = stated ?? use?.rhr_kW_m2 ?? null;
  if (peaks.length > 0 && (localised || rate === null)) {
    const why = localised
      ? 'Footprints cover less than a quarter of the floor: a localised fire, the entries at their peaks.'
      : 'No rate per area is known for the use: the entries at their peaks.';
    return estimate(sumOfPeaks, { peaks }, { workings, origins: { peaks: 'given' }, steps: [{ text: why }] });
  }
  if (rate === null) {
    const why = 'No heat release rate per area is known for this use, and not every entry has a peak.';
    return noteMissing(context, 'growth.fuelPlateau', 'options.plateau_kW_m2', why);
  }
  const A_fi = fireArea ?? (localised ? (covered ?? areas.floor) : areas.floor);
  const note = fireArea !== null ? 'stated fire area' : localised ? 'footprints of the entries' : 'the whole floor';
  return estimate(
    fuelPlateau,
    { RHR_f: rate, A_fi, peaks },
    {
      workings,
      origins: {
        RHR_f: stated === null ? { origin: 'catalogue', note: `usual for ${use?.label ?? 'the use'}` } : 'given',
        A_fi: fireArea === null ? { origin: 'computed', note } : 'given',
        peaks: 'given',
      },
    },
  );
}
