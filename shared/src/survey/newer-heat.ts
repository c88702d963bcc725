import type { PlaceableMaterial } from '../catalogue/placeable-material.ts';
import { ofOwn } from './new-entry.ts';
import type { EntryPart } from './survey-document.ts';

/** The heat of an own material's version in force. */
export interface NewerHeat {
  /** Id of the material. */
  readonly material: string;
  readonly version: number;
  readonly net_heat_MJ_kg: number;
  readonly low_MJ_kg: number;
  readonly high_MJ_kg: number;
  readonly heat_source: string;
  /** What else the version says of the material. */
  readonly known: Pick<EntryPart, 'cellulosic' | 'soot_yield' | 'co_yield'>;
}

/** The versions in force by material; built-in materials have none. */
export function heatsInForce(materials: readonly PlaceableMaterial[]): ReadonlyMap<string, NewerHeat> {
  return new Map(
    materials.flatMap(({ key, own, net_heat_MJ_kg, low_MJ_kg, high_MJ_kg, ...material }) =>
      own === undefined || own === null
        ? []
        : [
            [
              key,
              {
                material: key,
                version: own.version,
                net_heat_MJ_kg,
                low_MJ_kg,
                high_MJ_kg,
                heat_source: own.heat_source.slice(0, 500),
                known: ofOwn(material),
              },
            ] as const,
          ],
    ),
  );
}

/** The part with the newer heat in it; null where it has none to take. */
export function newerPart(part: EntryPart, inForce: ReadonlyMap<string, NewerHeat>): EntryPart | null {
  if (part.material === null || part.material_version === null) return null;
  const newer = inForce.get(part.material);
  if (newer === undefined || newer.version <= part.material_version) return null;
  const { version, net_heat_MJ_kg, low_MJ_kg, high_MJ_kg, heat_source, known } = newer;
  const { cellulosic: _, soot_yield: _soot, co_yield: _co, ...kept } = part;
  return { ...kept, material_version: version, net_heat_MJ_kg, low_MJ_kg, high_MJ_kg, heat_source, ...known };
}
