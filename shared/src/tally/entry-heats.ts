import type { Hazard } from '../catalogue/catalogue-row.ts';
import { enclosureFactor } from '../methods/load/enclosure-factor.ts';
import { protectedLoads } from '../methods/load/protected-loads.ts';
import { partHeat, type PartHeat } from './part-heat.ts';
import type { RoomInput, RoomInputEntry } from './room-input.ts';

export interface CountedPart {
  /** Pieces of the entry. */
  readonly count: number;
  readonly part: PartHeat;
  readonly psi: number;
  /** count · mass · H · ψ, MJ */
  readonly counted: number;
}

export interface EntryHeat {
  readonly entry: RoomInputEntry;
  readonly parts: readonly CountedPart[];
  /** All pieces, kg. */
  readonly mass: number;
  /** With ψ, MJ. */
  readonly counted: number;
}

const COUNTS_IN_ANY_CABINET: readonly Hazard[] = ['liquid', 'gas', 'aerosol', 'battery', 'oxidiser'];

/** Heat of every entry, part by part, with what its enclosure lets into the fire. */
export function entryHeats(input: RoomInput): readonly EntryHeat[] {
  const plain = input.contents.map((entry) => ({ entry, parts: entry.parts.map((part) => partHeat(entry, part)) }));
  const shares = input.options?.protected_loads === 'EN' ? protectedShares(plain) : undefined;
  return plain.map(({ entry, parts }) => {
    let mass = 0;
    let counted = 0;
    const countedParts = parts.map((part) => {
      const inRule = shares !== undefined && isProtected(entry, part);
      const psi = inRule ? (shares.get(entry) ?? 0) : factorOf(entry, part);
      const heat = entry.count * part.mass * part.heat * psi;
      mass += entry.count * part.mass;
      counted += heat;
      return { count: entry.count, part, psi, counted: heat };
    });
    return { entry, parts: countedParts, mass, counted };
  });
}

function factorOf(entry: RoomInputEntry, part: PartHeat): number {
  return enclosureFactor.run({
    enclosure: entry.enclosure ?? 'open',
    rated: entry.sealed_rating_min == null ? 'no' : 'yes',
    hazardous: countsInAnyCabinet(part) ? 'yes' : 'no',
  });
}

function countsInAnyCabinet(part: PartHeat): boolean {
  return part.material?.hazards.some((hazard) => COUNTS_IN_ANY_CABINET.includes(hazard)) ?? false;
}

function isProtected(entry: RoomInputEntry, part: PartHeat): boolean {
  return entry.enclosure === 'cabinet' && !countsInAnyCabinet(part);
}

/** The EN rule shared out: the largest containers count in full until what must count is reached, the rest not at all. */
function protectedShares(plain: readonly { entry: RoomInputEntry; parts: readonly PartHeat[] }[]) {
  const loads = plain
    .map(({ entry, parts }) => ({
      entry,
      heat: parts.reduce(
        (sum, part) => (isProtected(entry, part) ? sum + entry.count * part.mass * part.heat : sum),
        0,
      ),
    }))
    .filter((load) => load.heat > 0)
    .sort((a, b) => b.heat - a.heat);
  let left = protectedLoads.run({ Q: loads.map((load) => load.heat) });
  const shares = new Map<RoomInputEntry, number>();
  for (const { entry, heat } of loads) {
    const counted = Math.min(heat, left);
    shares.set(entry, counted / heat);
    left -= counted;
  }
  return shares;
}
