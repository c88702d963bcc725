import { estimate, type Estimate, type EstimateWarning, type Origins } from '../methods/estimate.ts';
import { fireLoad } from '../methods/load/fire-load.ts';
import type { WorkingStep } from '../methods/working.ts';
import type { CountedPart, EntryHeat } from './entry-heats.ts';
import type { EntryShare, MaterialShare } from './room-tally.ts';
import type { TallyContext } from './tally-context.ts';

/** Σ count · mass · H · ψ over some parts, as an estimate. */
export function sumOfParts(
  parts: readonly CountedPart[],
  context: TallyContext,
  warnings: readonly EstimateWarning[] = [],
  steps: readonly WorkingStep[] = [],
): Estimate {
  return estimate(
    fireLoad,
    {
      n: parts.map(({ count }) => count),
      M: parts.map(({ part }) => part.mass),
      H: parts.map(({ part }) => part.heat),
      psi: parts.map(({ psi }) => psi),
    },
    {
      workings: context.workings,
      warnings,
      steps,
      ...(context.workings ? { origins: originsOf(parts) } : {}),
    },
  );
}

function originsOf(parts: readonly CountedPart[]): Origins<typeof fireLoad.inputs> {
  return {
    n: 'given',
    M: 'given',
    H: parts.every(({ part }) => part.ownHeat)
      ? { origin: 'given', note: 'copied into the entry when it was placed' }
      : 'catalogue',
    psi: { origin: 'default', note: 'from how each entry is enclosed' },
  };
}

export function allParts(heats: readonly EntryHeat[]): CountedPart[] {
  const all: CountedPart[] = [];
  for (const { parts } of heats) for (const part of parts) all.push(part);
  return all;
}

/** Each entry's heat and its share, in the order of the contents. */
export function sharesByEntry(heats: readonly EntryHeat[], total: number, context: TallyContext): EntryShare[] {
  return heats.map((heat) => ({
    id: heat.entry.id,
    label: heat.entry.label ?? heat.entry.id,
    heat: sumOfParts(heat.parts, context),
    mass_kg: heat.mass,
    share: shareOf(heat.counted, total),
  }));
}

/** Heat by material, largest first; parts with a heat of their own stand under their own label. */
export function sharesByMaterial(parts: readonly CountedPart[], total: number, context: TallyContext): MaterialShare[] {
  const groups = new Map<string, CountedPart[]>();
  for (const counted of parts) {
    const group = groups.get(counted.part.key);
    if (group) group.push(counted);
    else groups.set(counted.part.key, [counted]);
  }
  return [...groups]
    .map(([key, group]) => {
      const heat = sumOfParts(group, context);
      return {
        material: key,
        label: group[0]!.part.material?.label ?? group[0]!.part.label,
        heat,
        mass_kg: group.reduce((sum, { count, part }) => sum + count * part.mass, 0),
        share: shareOf(heat.value ?? 0, total),
      };
    })
    .sort((a, b) => b.share - a.share || (a.material < b.material ? -1 : 1));
}

function shareOf(part: number, total: number): number {
  return total > 0 ? part / total : 0;
}
