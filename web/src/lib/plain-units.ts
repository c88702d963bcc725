/**
 * Units inside a sentence as they are written by hand, kept on the line of their number; a power is left for
 * `FormulaText` to raise.
 */
export function plainUnits(sentence: string): string {
  return sentence
    .replaceAll(/\bm2\b/g, 'm²')
    .replaceAll(/\bm3\b/g, 'm³')
    .replaceAll(/\bm-1\/2\b/g, 'm^(−½)')
    .replaceAll(/\bm1\/2\b/g, 'm^(½)')
    .replaceAll(/\bm5\/2\b/g, 'm^(5/2)')
    .replaceAll(/(\d) (m²|m³|m|kW|MW|MJ|kg|min|s|%|K|°C)(?![\w^/·⁄])/g, '$1\u00a0$2');
}
