/** Characters that only steer joining or breaking: they have no form of their own and are left out. */
const UNSEEN = /\u{ad}|\p{Variation_Selector}|[\u{200b}-\u{200d}\u{2060}\u{feff}]/gu;
/** Controls, marks that reorder text, halves of a pair, unassigned and private characters: shown by their number. */
const UNPRINTABLE = /[\p{Cc}\p{Cf}\p{Cs}\p{Co}\p{Cn}\u2028\u2029]/gu;
const PLAIN = /^[\x20-\x7e\u00a0-\u00ac\u00ae-\u017f]*$/u;

/** The visible stand-in for a character that has no glyph or must not act: `‹U+202E›`. */
export function characterNumber(codePoint: number): string {
  return `‹U+${codePoint.toString(16).toUpperCase().padStart(4, '0')}›`;
}

/**
 * Text as it can be set on one line: composed (NFC), line breaks and tabs turned into spaces, joiners left out and every
 * control character replaced by its number, so that nothing a person typed can hide, reorder or vanish in print.
 */
export function printableText(text: string): string {
  if (PLAIN.test(text)) return text;
  return text
    .normalize('NFC')
    .replace(/\r\n|[\n\r\t\v\f]/g, ' ')
    .replace(UNSEEN, '')
    .replace(UNPRINTABLE, (character) => characterNumber(character.codePointAt(0) ?? 0));
}
