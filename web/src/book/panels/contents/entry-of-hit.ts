import { materialByKey } from '@embertally/shared/catalogue/materials';
import { scaleKind } from '@embertally/shared/catalogue/scale-kind';
import type { PlaceableHit } from '@embertally/shared/catalogue/search-catalogue';
import { type EntryPlace, newEntryFromKind, newEntryFromMaterial } from '@embertally/shared/survey/new-entry';
import type { Entry } from '@embertally/shared/survey/survey-document';

/**
 * An entry made from a row of the catalogue in an amount of its own.
 *
 * @param amount in the unit the kind is measured by; null for the amount its row stands for
 * @param mass_kg of one piece of a bare material
 */
export function entryOfHit(hit: PlaceableHit, amount: number | null, mass_kg: number, place: EntryPlace): Entry {
  if (hit.type === 'material') return newEntryFromMaterial(hit.row, mass_kg, place);
  const entry = newEntryFromKind(hit.row, materialByKey, place);
  if (amount === null || hit.row.measure.by === 'pieces') return entry;
  const scaled = scaleKind(hit.row, amount);
  const { by } = hit.row.measure;
  return {
    ...entry,
    parts: entry.parts.map((part, index) => ({ ...part, mass_kg: scaled.parts[index]?.mass_kg ?? part.mass_kg })),
    width_m: scaled.width_m,
    depth_m: scaled.depth_m,
    height_m: scaled.height_m,
    peak_kW: scaled.peak_kW,
    measure: { by, quantity: amount, density_kg_m3: null },
  };
}
