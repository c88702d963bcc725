import type { Kind } from '../catalogue/catalogue-row.ts';
import { materialByKey } from '../catalogue/materials.ts';
import type { PlaceableMaterial } from '../catalogue/placeable-material.ts';
import type { RoomInputEntry, RoomInputPart } from '../tally/room-input.ts';

const ID = 'further';

/** One piece of a kind, as it would be placed. */
export function furtherOfKind(kind: Kind): RoomInputEntry {
  return {
    id: ID,
    label: kind.label,
    kind: kind.key,
    count: 1,
    keeping: kind.keeping,
    enclosure: kind.enclosure,
    parts: kind.parts.map(({ material, mass_kg }) => partOf(materialByKey(material), material, mass_kg)),
    width_m: kind.width_m,
    depth_m: kind.depth_m,
    height_m: kind.height_m,
    growth: kind.growth,
    peak_kW: kind.peak_kW,
  };
}

/** One kilogram of a material. */
export function furtherOfMaterial(material: PlaceableMaterial): RoomInputEntry {
  return { id: ID, label: material.label, count: 1, parts: [partOf(material, material.key, 1)] };
}

function partOf(material: PlaceableMaterial | undefined, key: string, mass_kg: number): RoomInputPart {
  if (!material) return { material: key, mass_kg };
  const { net_heat_MJ_kg, low_MJ_kg, high_MJ_kg, label, cellulosic } = material;
  return { material: key, label, mass_kg, net_heat_MJ_kg, low_MJ_kg, high_MJ_kg, cellulosic };
}
