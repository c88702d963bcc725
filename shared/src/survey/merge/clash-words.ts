import { rowsOf } from '../rows.ts';
import type { EntityKind, SurveyDocument } from '../survey-document.ts';
import { openingWords, quoted } from '../words.ts';

const FIELD_WORDS: Readonly<Record<string, string>> = {
  x_m: 'position',
  y_m: 'position',
  ring: 'outline',
  holes: 'parts cut out',
  parts: 'materials and masses',
  room_id: 'room',
  wall: 'wall',
  offset_m: 'position in the wall',
  sill_m: 'sill height',
  rating_min: 'rated resistance',
  plan_picture: 'plan picture',
};

/** How a person would name a row: room “Paint shop”, door “Stage door”, “Timber flats”, a corner. */
export function rowWords(document: SurveyDocument, kind: EntityKind, id: string): string {
  const row = rowsOf(document, kind).get(id);
  if (row === undefined || kind === 'corner') return `a ${kind}`;
  if ('kind' in row && 'wall' in row) return `the ${openingWords(row)}`;
  if ('name' in row) return `${kind} ${quoted(row.name)}`;
  return 'label' in row ? quoted(row.label) : `a ${kind}`;
}

/** A field as a person would name it, without its unit. */
export function fieldWords(field: string): string {
  return FIELD_WORDS[field] ?? field.replace(/_(m|kg|m2|kW|kW_m2|MJ_kg|min|deg|pct)$/, '').replaceAll('_', ' ');
}
