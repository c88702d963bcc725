import type { Estimate } from '@embertally/shared/methods/estimate';
import type { Shown } from '../../lib/use-quantity.ts';

/** An estimate as words: its figure and unit, or why the event never comes. */
export function estimateText(estimate: Estimate, show: (value: number, unit: string) => Shown): string {
  if (estimate.value === null) return `never: ${estimate.never ?? 'it does not happen'}`;
  const { text, unit } = show(estimate.value, estimate.unit);
  // A reader says the exponent; the sign that raises it on screen is not spoken.
  return unit === '' ? text : `${text} ${unit.replaceAll('^', '')}`;
}
