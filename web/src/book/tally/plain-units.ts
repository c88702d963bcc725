/** Square and cubic metres inside a sentence as they are written by hand. */
export function plainUnits(sentence: string): string {
  return sentence.replaceAll(/\bm2\b/g, 'm²').replaceAll(/\bm3\b/g, 'm³');
}
