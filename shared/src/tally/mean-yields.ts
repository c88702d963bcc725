import type { Material } from '../catalogue/catalogue-row.ts';
import type { CountedPart, EntryHeat } from './entry-heats.ts';

/** Yields of the contents, kg per kg burnt, weighted by mass. */
export interface MeanYields {
  readonly soot: number;
  readonly carbonMonoxide: number;
  /** Share of the mass whose yields are not known and were assumed, 0 to 1. */
  readonly assumed: number;
  /** Share of the mass for which the yields of red oak stand, 0 to 1. */
  readonly asWood: number;
}

/** Red oak; Tewarson, SFPE Handbook of Fire Protection Engineering, from memory. */
const WOOD = { soot: 0.015, carbonMonoxide: 0.004 };
/** What performance codes take before flashover: C/VM2 (New Zealand), from memory. */
export const ASSUMED_YIELDS = { soot: 0.07, carbonMonoxide: 0.04 };

/** Mean yields of what can burn, in a fire with enough air; undefined while nothing can. */
export function meanYields(heats: readonly EntryHeat[]): MeanYields | undefined {
  const sum = { mass: 0, soot: 0, carbonMonoxide: 0, assumed: 0, asWood: 0 };
  for (const { parts } of heats) {
    for (const part of parts) {
      if (!(part.counted > 0)) continue;
      const mass = part.count * part.part.mass;
      const own = ownYields(part);
      const wood = own === undefined && isWoodlike(part.part.material);
      const { soot, carbonMonoxide } = own ?? (wood ? WOOD : ASSUMED_YIELDS);
      sum.mass += mass;
      sum.soot += mass * soot;
      sum.carbonMonoxide += mass * carbonMonoxide;
      if (wood) sum.asWood += mass;
      else if (own === undefined) sum.assumed += mass;
    }
  }
  if (!(sum.mass > 0)) return undefined;
  return {
    soot: sum.soot / sum.mass,
    carbonMonoxide: sum.carbonMonoxide / sum.mass,
    assumed: sum.assumed / sum.mass,
    asWood: sum.asWood / sum.mass,
  };
}

function ownYields({ part }: CountedPart): typeof WOOD | undefined {
  const { soot, carbonMonoxide } = part;
  return soot === null || carbonMonoxide === null ? undefined : { soot, carbonMonoxide };
}

function isWoodlike(material: Material | undefined): boolean {
  return (
    material !== undefined && material.cellulosic && (material.group === 'wood and board' || material.group === 'paper')
  );
}
