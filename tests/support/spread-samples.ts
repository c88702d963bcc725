import { growthCoefficient } from '@embertally/shared/methods/growth/growth-coefficient';
import { ignitionOf } from '@embertally/shared/spread/ignition-class';
import type { SpreadInput } from '@embertally/shared/spread/simulate-spread';
import type { SpreadEntry } from '@embertally/shared/spread/spread-entry';
import type { SpreadRoom } from '@embertally/shared/spread/spread-room';

const alphaOf = (growth: 'slow' | 'medium' | 'fast' | 'ultra-fast') =>
  growthCoefficient.run({ growth, convention: 'EN' });

export const ULTRA_FAST_KW_S2 = alphaOf('ultra-fast');

/** A large hall: no hot layer, no flashover, more air than any fire of these tests asks for. */
export const HALL: SpreadRoom = {
  surfaces: null,
  liningArea_m2: 2000,
  factorBefore: 50,
  factorAfter: 50,
  flashover_kW: null,
  ambient_C: 20,
  large: false,
  oxygenLimitedHeat_MJ: null,
};

/** An entry of 1 × 1 m that lights like upholstery and burns fast. */
export function spreadEntry(
  id: string,
  at: readonly [number, number],
  change: Partial<Omit<SpreadEntry, 'place'>> & {
    readonly size?: readonly [number, number];
    readonly place?: Partial<NonNullable<SpreadEntry['place']>>;
  } = {},
): SpreadEntry {
  const { size = [1, 1], place, ...rest } = change;
  return {
    id,
    place: {
      x_m: at[0],
      y_m: at[1],
      width_m: size[0],
      depth_m: size[1],
      rotation_deg: 0,
      base_m: 0,
      height_m: 1,
      ...place,
    },
    heat_MJ: 500,
    peak_kW: 2000,
    growth: { by: 't-squared', alpha_kW_s2: alphaOf('fast') },
    radiativeFraction: 0.35,
    ignition: ignitionOf('normal'),
    enclosure: 'open',
    ...rest,
  };
}

export function spreadCase(entries: readonly SpreadEntry[], change: Partial<SpreadInput> = {}): SpreadInput {
  return {
    room: HALL,
    entries,
    first: entries[0]?.id ?? null,
    fluxFactor: 1,
    ignition: 'dose',
    flashoverGrowth_kW_s2: ULTRA_FAST_KW_S2,
    ...change,
  };
}

/** Area under `[s, kW]` pairs, MJ. */
export function areaOf(curve: readonly (readonly [number, number])[]): number {
  return curve.slice(1).reduce((sum, [t, rate], index) => {
    const [before, rateBefore] = curve[index]!;
    return sum + ((t - before) * (rate + rateBefore)) / 2000;
  }, 0);
}
