/** What an input that is wanting is called on paper, by the beginning of its path in the estimate contract. */
const WORDS: readonly (readonly [string, string])[] = [
  ['room.openings', 'openings'],
  ['room.use', 'use of the room'],
  ['room.lining', 'linings'],
  ['room.ring_m', 'outline of the room'],
  ['room.height_m', 'height of the room'],
  ['room.roof_vents', 'roof vents'],
  ['room.hotLayer', 'openings and linings'],
  ['contents', 'contents'],
  ['limits', 'the limit'],
  ['options.plateau_kW_m2', 'peak of every entry'],
  ['options.kc', 'kind of structure'],
  ['options', 'a choice of the method'],
  ['room', 'what is known of the room'],
];

/** The words for an input; `–` for what this version does not compute, whatever is known. */
export function inputWords(input: string): string {
  return WORDS.find(([path]) => input.startsWith(path))?.[1] ?? '–';
}
