import type { Kind } from '../catalogue/catalogue-row.ts';
import type { PlaceableMaterial } from '../catalogue/placeable-material.ts';
import { placeCurve } from '../calorimeter/place-curve.ts';
import type { Entry, EntryPart } from './survey-document.ts';

/** Who placed the entry, where and when; ids and times come from the caller. */
export interface EntryPlace {
  readonly id: string;
  readonly room_id: string;
  readonly x_m: number;
  readonly y_m: number;
  readonly recorded_by: string | null;
  readonly recorded_at: string | null;
}

/** A part of an entry with the material's heat and source copied, so that the tally never changes with the catalogue. */
export function partOf(material: PlaceableMaterial, mass_kg: number): EntryPart {
  const { own, source } = material;
  const heat_source = own?.heat_source ?? `${source.title}, ${source.locator}`;
  return {
    material: material.key,
    material_version: own?.version ?? null,
    label: material.label,
    net_heat_MJ_kg: material.net_heat_MJ_kg,
    low_MJ_kg: material.low_MJ_kg,
    high_MJ_kg: material.high_MJ_kg,
    heat_source: heat_source.slice(0, 500),
    mass_kg,
    moisture_pct: null,
    ...(own == null ? {} : ofOwn(material)),
  };
}

/** What the catalogue cannot be asked about an own material later. */
export function ofOwn({
  cellulosic,
  soot_yield,
  co_yield,
}: Pick<PlaceableMaterial, 'cellulosic' | 'soot_yield' | 'co_yield'>): Pick<
  EntryPart,
  'cellulosic' | 'soot_yield' | 'co_yield'
> {
  return {
    cellulosic,
    ...(soot_yield === null ? {} : { soot_yield }),
    ...(co_yield === null ? {} : { co_yield }),
  };
}

/**
 * One piece of a kind of the catalogue.
 *
 * @param materials finds the kind's materials by key; a material it does not know is an error of the catalogue
 */
export function newEntryFromKind(
  kind: Kind,
  materials: (key: string) => PlaceableMaterial | undefined,
  place: EntryPlace,
): Entry {
  const parts = kind.parts.map((part) => {
    const material = materials(part.material);
    if (material === undefined) throw new Error(`The kind ${kind.key} names the unknown material ${part.material}.`);
    return partOf(material, part.mass_kg);
  });
  return {
    ...blankEntry(place),
    kind: kind.key,
    label: kind.label,
    parts,
    width_m: kind.width_m,
    depth_m: kind.depth_m,
    height_m: kind.height_m,
    keeping: kind.keeping,
    enclosure: kind.enclosure,
    growth: kind.growth,
    peak_kW: kind.peak_kW,
    radiative_fraction: kind.radiative_fraction,
    ignition_class: kind.ignition_class,
  };
}

/**
 * A quantity of one material in a heap, stack or vessel. A measured curve of the material comes with it: of one piece, or of
 * the surface that faces up.
 *
 * @param mass_kg 0 to 1,000,000
 */
export function newEntryFromMaterial(material: PlaceableMaterial, mass_kg: number, place: EntryPlace): Entry {
  const blank = blankEntry(place);
  const curve = material.own?.curve ?? null;
  return {
    ...blank,
    label: material.label,
    parts: [partOf(material, mass_kg)],
    curve:
      curve === null
        ? null
        : placeCurve(curve.points, curve.per === 'piece' ? blank.count : blank.width_m * blank.depth_m).map(
            ([t_s, q_kW]): [number, number] => [t_s, q_kW],
          ),
    radiative_fraction: material.radiative_fraction,
    ignition_class: material.ignition_class,
  };
}

function blankEntry(place: EntryPlace): Omit<Entry, 'label' | 'parts'> {
  return {
    id: place.id,
    room_id: place.room_id,
    kind: null,
    count: 1,
    x_m: place.x_m,
    y_m: place.y_m,
    rotation_deg: 0,
    base_height_m: 0,
    width_m: 1,
    depth_m: 1,
    height_m: 1,
    keeping: 'stored',
    enclosure: 'open',
    sealed_rating_min: null,
    evidence: 'estimated',
    growth: null,
    peak_kW: null,
    curve: null,
    radiative_fraction: null,
    ignition_class: null,
    ignites_at_kW_m2: null,
    note: '',
    photos: [],
    measure: null,
    recorded_by: place.recorded_by,
    recorded_at: place.recorded_at,
    confirmed_by: null,
    confirmed_at: null,
  };
}
