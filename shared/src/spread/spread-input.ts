import { growthCoefficient } from '../methods/growth/growth-coefficient.ts';
import type { EntryHeat } from '../tally/entry-heats.ts';
import type { ChosenGrowth, GrowthClass } from '../tally/growth-class.ts';
import type { RoomAreas } from '../tally/room-areas.ts';
import type { RoomInput } from '../tally/room-input.ts';
import { surfaceAreas, type RoomLinings } from '../tally/room-linings.ts';
import type { RoomOpenings } from '../tally/room-openings.ts';
import type { RoomTally } from '../tally/room-tally.ts';
import {
  enclosureOf,
  growthOf,
  ignitionClassOf,
  peakOf,
  placeOf,
  radiativeFractionOf,
  type EntryGiven,
} from './entry-defaults.ts';
import { ignitionOf } from './ignition-class.ts';
import type { SpreadInput } from './simulate-spread.ts';
import { SPREAD_DEFAULTS, type SpreadDefault, type SpreadDefaultCode } from './spread-defaults.ts';
import type { SpreadEntry } from './spread-entry.ts';
import type { SpreadRoom } from './spread-room.ts';

/** What the tally of the room has already worked out. */
export interface SpreadGiven {
  readonly input: RoomInput;
  readonly heats: readonly EntryHeat[];
  readonly areas: RoomAreas;
  readonly openings: RoomOpenings;
  readonly linings: RoomLinings;
  readonly chosen: ChosenGrowth;
  /** The section `room`: regime and flashover criteria. */
  readonly room: Pick<RoomTally['room'], 'regime' | 'flashover'>;
  /** Heat to the oxygen limit of a closed room, MJ; null while it is not known. */
  readonly oxygenLimitedHeat_MJ: number | null;
}

/** The input of the spread of fire from the tally of a room, with every default that had to be used. */
export function spreadInput(given: SpreadGiven): {
  readonly input: SpreadInput;
  readonly defaults: readonly SpreadDefault[];
} {
  const { input, chosen } = given;
  const convention = input.options?.growth_convention ?? 'EN';
  const alphaOf = (growth: GrowthClass) => growthCoefficient.run({ growth, convention });
  const used = new Map<SpreadDefaultCode, string[]>();
  const entries = given.heats.map(({ entry, parts }): SpreadEntry => {
    const own = input.options?.combustion_factor ?? null;
    const one: EntryGiven = {
      entry,
      parts,
      heat_MJ: parts.reduce((sum, { part, counted }) => sum + (own ?? part.combustionFactor) * counted, 0),
      roomAlpha_kW_s2: alphaOf(chosen.growth),
      alphaOf,
      note: (code) => used.set(code, [...(used.get(code) ?? []), entry.id]),
    };
    const growth = growthOf(one);
    const peak_kW = growth.by === 'measured' ? Math.max(...growth.points.map(([, rate]) => rate)) : peakOf(one);
    return {
      id: entry.id,
      place: placeOf(one, peak_kW),
      heat_MJ: one.heat_MJ,
      peak_kW,
      growth,
      radiativeFraction: radiativeFractionOf(one),
      ignition: ignitionOf(ignitionClassOf(one), entry.ignites_at_kW_m2 ?? null),
      enclosure: enclosureOf(one),
    };
  });
  return {
    input: {
      room: roomOf(given),
      entries,
      first: input.options?.first_entry ?? null,
      fluxFactor: 1,
      ignition: 'dose',
      flashoverGrowth_kW_s2: alphaOf('ultra-fast'),
    },
    defaults: [...used].map(([code, entryIds]) => ({ code, text: SPREAD_DEFAULTS[code], entryIds })),
  };
}

function roomOf({ input, areas, openings, linings, room, oxygenLimitedHeat_MJ }: SpreadGiven): SpreadRoom {
  const { used, afterGlass, roofVents } = openings;
  const surface = surfaceAreas(areas, used, roofVents);
  return {
    surfaces:
      linings.unknown.length > 0
        ? null
        : (['walls', 'ceiling', 'floor'] as const).map((side) => ({
            area_m2: surface[side],
            layers: linings.layers[side],
          })),
    liningArea_m2: used.liningArea,
    factorBefore: used.factor,
    factorAfter: afterGlass.factor,
    flashover_kW: lowestCriterion(room.flashover),
    ambient_C: input.options?.ambient_C ?? 20,
    large: room.regime === 'large',
    oxygenLimitedHeat_MJ,
  };
}

/** The same number as the section `room` gives its time for: the lowest criterion that applies. */
function lowestCriterion({ thomas, babrauskas, mqh }: RoomTally['room']['flashover']): number | null {
  const values = [thomas, babrauskas, mqh].flatMap((one) => (one?.applicable && one.value !== null ? [one.value] : []));
  return values.length > 0 ? Math.min(...values) : null;
}
