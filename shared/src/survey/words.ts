import type { Entry, Opening, Room } from './survey-document.ts';

/** A length as refusals say it: metres with two decimals, three where the millimetres matter. */
export function metres(value_m: number): string {
  const millimetres = Math.round(value_m * 1000);
  return `${(millimetres / 1000).toFixed(millimetres % 10 === 0 ? 2 : 3)} m`;
}

export function squareMetres(value_m2: number): string {
  return `${value_m2.toFixed(2)} m²`;
}

/** “Paint shop” */
export function nameOf(row: Pick<Room, 'name'>): string {
  return quoted(row.name);
}

/** door “Stage door”, or just door when it has no label. */
export function openingWords(opening: Pick<Opening, 'kind' | 'label'>): string {
  return opening.label === '' ? opening.kind : `${opening.kind} ${quoted(opening.label)}`;
}

export function entryWords(entry: Pick<Entry, 'label'>): string {
  return quoted(entry.label);
}

/** “A”, “B” and 3 more */
export function listed(names: readonly string[]): string {
  const shown = names.slice(0, 3);
  const more = names.length - shown.length;
  if (more > 0) return `${shown.join(', ')} and ${more} more`;
  return shown.length < 2 ? shown.join('') : `${shown.slice(0, -1).join(', ')} and ${shown.at(-1) ?? ''}`;
}

/** Long names are cut, so that a sentence stays a sentence. */
export function quoted(text: string): string {
  const characters = [...text];
  return `“${characters.length > 60 ? `${characters.slice(0, 59).join('')}…` : text}”`;
}
