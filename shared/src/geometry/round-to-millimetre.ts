/**
 * The nearest millimetre of a length or coordinate in metres. Halves go up. A command rounds once, when it commits a
 * gesture; nothing else rounds, so places never creep.
 */
export function roundToMillimetre(value_m: number): number {
  const rounded = Math.round(value_m * 1000) / 1000;
  return rounded === 0 ? 0 : rounded;
}
