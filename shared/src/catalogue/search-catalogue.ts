import type { Kind, Material } from './catalogue-row.ts';
import { KINDS } from './kinds.ts';
import { MATERIALS } from './materials.ts';
import type { PlaceableMaterial } from './placeable-material.ts';

export type CatalogueHit =
  { readonly type: 'kind'; readonly row: Kind } | { readonly type: 'material'; readonly row: Material };

/** A hit among the catalogue and the organisation's own materials. */
export type PlaceableHit =
  { readonly type: 'kind'; readonly row: Kind } | { readonly type: 'material'; readonly row: PlaceableMaterial };

interface SearchOptions {
  /** Keys used last, newest first; among equal matches they come first. */
  readonly recent?: readonly string[];
  /** At most so many; 20 when not said. */
  readonly limit?: number;
}

interface WithOwn extends SearchOptions {
  /** Approved materials of the organisation's own, searched with the built-in ones; the same array is indexed once. */
  readonly own: readonly PlaceableMaterial[];
}

interface Indexed {
  readonly hit: PlaceableHit;
  readonly label: string;
  readonly labelWords: readonly string[];
  /** Synonyms and the group. */
  readonly otherWords: readonly string[];
}

/** One spelling: no capitals, no diacritics, no punctuation. */
function fold(text: string): string {
  return text
    .normalize('NFD')
    .replaceAll(/\p{M}/gu, '')
    .toLowerCase()
    .replaceAll(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();
}

function indexed(hit: PlaceableHit): Indexed {
  const label = fold(hit.row.label);
  return {
    hit,
    label,
    labelWords: label.split(' '),
    otherWords: fold([...hit.row.synonyms, hit.row.group].join(' ')).split(' '),
  };
}

const INDEX: readonly Indexed[] = [
  ...KINDS.map((row) => indexed({ type: 'kind', row })),
  ...MATERIALS.map((row) => indexed({ type: 'material', row })),
];

const ownIndexes = new WeakMap<readonly PlaceableMaterial[], readonly Indexed[]>();

/** Own materials come before built-in ones of the same rank: who made one wants it. */
function indexWith(own: readonly PlaceableMaterial[] | undefined): readonly Indexed[] {
  if (own === undefined || own.length === 0) return INDEX;
  const known = ownIndexes.get(own) ?? own.map((row) => indexed({ type: 'material', row }));
  ownIndexes.set(own, known);
  return [...known, ...INDEX];
}

/** How well a row answers, lower is better; undefined when a word of the query is not in it. */
function rank(row: Indexed, query: string, words: readonly string[]): number | undefined {
  if (row.label === query) return 0;
  if (row.label.startsWith(query)) return 1;
  let worst = 2;
  for (const word of words) {
    if (row.labelWords.some((own) => own.startsWith(word))) continue;
    if (row.otherWords.some((own) => own.startsWith(word))) worst = Math.max(worst, 3);
    // Inside a word only from three letters on: two would match nearly everything.
    else if (word.length >= 3 && row.label.includes(word)) worst = Math.max(worst, 4);
    else return undefined;
  }
  return worst;
}

/**
 * Kinds and materials that answer what was typed, best first: a label that begins so, then words of the label, then
 * synonyms and groups, then parts of words. Every word typed must be found. Capitals and diacritics do not matter. Among
 * equals: what was used last, then own materials, then kinds before materials, then the catalogue's order. An empty query gives what was used
 * last, and nothing when nothing was.
 */
export function searchCatalogue(query: string, options: WithOwn): readonly PlaceableHit[];
export function searchCatalogue(query: string, options?: SearchOptions): readonly CatalogueHit[];
export function searchCatalogue(query: string, options: Partial<WithOwn> = {}): readonly PlaceableHit[] {
  const { recent = [], limit = 20, own } = options;
  const index = indexWith(own);
  const folded = fold(query);
  const recency = new Map(recent.map((key, place) => [key, place]));
  const placeOf = (row: Indexed) => recency.get(row.hit.row.key) ?? Number.POSITIVE_INFINITY;
  if (folded === '') {
    return index
      .filter((row) => recency.has(row.hit.row.key))
      .toSorted((a, b) => placeOf(a) - placeOf(b))
      .slice(0, limit)
      .map((row) => row.hit);
  }
  const words = folded.split(' ');
  const found: { readonly row: Indexed; readonly rank: number; readonly place: number }[] = [];
  for (const row of index) {
    const value = rank(row, folded, words);
    if (value !== undefined) found.push({ row, rank: value, place: placeOf(row) });
  }
  return found
    .toSorted((a, b) => a.rank - b.rank || (a.place === b.place ? 0 : a.place - b.place))
    .slice(0, limit)
    .map(({ row }) => row.hit);
}
