/** Units inside a sentence as they are written by hand; a power is left for `FormulaText` to raise. */
export function plainUnits(sentence: string): string {
  return sentence
    .replaceAll(/\bm2\b/g, 'm²')
    .replaceAll(/\bm3\b/g, 'm³')
    .replaceAll(/\bm-1\/2\b/g, 'm^(−½)')
    .replaceAll(/\bm1\/2\b/g, 'm^(½)')
    .replaceAll(/\bm5\/2\b/g, 'm^(5/2)');
}
