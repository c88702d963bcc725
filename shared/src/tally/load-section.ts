import { estimate } from '../methods/estimate.ts';
import { asKept } from '../methods/load/as-kept.ts';
import { combustionFactor } from '../methods/load/combustion-factor.ts';
import { perEnclosure } from '../methods/load/per-enclosure.ts';
import { perFloor } from '../methods/load/per-floor.ts';
import type { EntryHeat } from './entry-heats.ts';
import type { RoomAreas } from './room-areas.ts';
import type { RoomInput } from './room-input.ts';
import { allParts, sharesByEntry, sharesByMaterial, sumOfParts } from './room-load.ts';
import type { RoomTally } from './room-tally.ts';
import { noteMissing, type TallyContext } from './tally-context.ts';

const NO_FLOOR = 'The room has no floor area.';

/** The section `load` of a tally. */
export function loadSection(
  input: RoomInput,
  areas: RoomAreas,
  heats: readonly EntryHeat[],
  context: TallyContext,
): RoomTally['load'] {
  const { workings } = context;
  const total = sumOfParts(allParts(heats), context);
  const Q = total.value ?? 0;
  const kept = (keeping: 'fixed' | 'stored' | 'passing') =>
    sumOfParts(allParts(heats.filter(({ entry }) => (entry.keeping ?? 'stored') === keeping)), context);
  const parts = allParts(heats);
  const m = estimate(
    combustionFactor,
    { m: parts.map(({ part }) => part.combustionFactor), Q: parts.map(({ part }) => part.counted) },
    { workings },
  );
  const base = {
    total,
    fixed: kept('fixed'),
    stored: kept('stored'),
    passing: kept('passing'),
    combustionFactor: m,
    byMaterial: sharesByMaterial(heats, Q, context),
    byEntry: sharesByEntry(heats, Q, context),
  };
  if (!(areas.floor > 0)) {
    for (const path of ['perFloor', 'perEnclosure', 'asKept', 'design']) {
      noteMissing(context, `load.${path}`, 'room.ring_m', NO_FLOOR);
    }
    return base;
  }
  const floorLoad = estimate(perFloor, { Q, A_f: areas.floor }, { workings });
  return {
    ...base,
    perFloor: floorLoad,
    perEnclosure: estimate(perEnclosure, { Q, A_t: areas.enclosing }, { workings }),
    asKept: estimate(asKept, { m: m.value ?? 1, q_fk: floorLoad.value ?? 0 }, { workings }),
  };
}
