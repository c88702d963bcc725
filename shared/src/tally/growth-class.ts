import { useByKey } from '../catalogue/uses.ts';
import type { EstimateWarning } from '../methods/estimate.ts';
import type { EntryHeat } from './entry-heats.ts';
import { mostlyFluid } from './mostly-fluid.ts';
import type { RoomInput } from './room-input.ts';

export type GrowthClass = 'slow' | 'medium' | 'fast' | 'ultra-fast';

const FASTEST_FIRST: readonly GrowthClass[] = ['ultra-fast', 'fast', 'medium', 'slow'];
/** An entry with less of the load than this does not set the pace of the room. */
const LEAST_SHARE = 0.05;

const BURNS_AT_ONCE: EstimateWarning = {
  code: 'BURNS_AT_ONCE',
  text: 'Liquids or gases hold at least 5 % of the load. They burn at their peak from the start; ultra-fast is the nearest class.',
};

export interface ChosenGrowth {
  readonly growth: GrowthClass;
  readonly origin: 'given' | 'catalogue' | 'computed' | 'default';
  readonly why: string;
  readonly warnings: readonly EstimateWarning[];
}

/** Growth class of the room: stated, else the fastest among entries of weight, else the use's, else medium. */
export function growthClass(input: RoomInput, heats: readonly EntryHeat[]): ChosenGrowth {
  const stated = input.options?.growth ?? null;
  if (stated !== null) return { growth: stated, origin: 'given', why: 'stated for the room', warnings: [] };
  const total = heats.reduce((sum, { counted }) => sum + counted, 0);
  const paces = new Set(
    heats
      .filter(({ counted, entry }) => entry.curve == null && counted > 0 && counted >= LEAST_SHARE * total)
      .map(({ entry, parts }) => entry.growth ?? (mostlyFluid(parts) ? 'at once' : null)),
  );
  const fastest = paces.has('at once') ? 'ultra-fast' : FASTEST_FIRST.find((pace) => paces.has(pace));
  if (fastest !== undefined) {
    const why = 'the fastest class among entries with at least 5 % of the load';
    return { growth: fastest, origin: 'computed', why, warnings: paces.has('at once') ? [BURNS_AT_ONCE] : [] };
  }
  const use = input.room.use == null ? undefined : useByKey(input.room.use);
  if (use) return { growth: use.growth, origin: 'catalogue', why: `usual for the use “${use.label}”`, warnings: [] };
  return {
    growth: 'medium',
    origin: 'default',
    why: 'nothing says how fast a fire would grow here',
    warnings: [
      {
        code: 'GROWTH_ASSUMED',
        text: 'Neither the room, its contents nor its use says how fast a fire would grow: medium is assumed.',
      },
    ],
  };
}
