/**
 * A number as a working prints it: five significant figures, no trailing zeros, no exponent between 1e-6 and 1e9.
 * Screens format the values of an estimate themselves; this is for sentences inside steps and warnings, where a value
 * that is none is a word.
 * @param figures significant figures; 3 for what was assumed or rounded anyway
 */
export function figure(value: number, figures = 5): string {
  if (value === 0) return '0';
  if (!Number.isFinite(value)) return Number.isNaN(value) ? 'no number' : 'without bound';
  const size = Math.abs(value);
  if (size >= 1e9 || size < 1e-6) return value.toExponential(3);
  return String(Number(value.toPrecision(figures)));
}
