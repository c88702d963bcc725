import type { Estimate } from '@embertally/shared/methods/estimate';
import { convert } from '@embertally/shared/units/convert';
import { displayUnit } from '@embertally/shared/units/display-unit';
import { formatQuantity } from '@embertally/shared/units/format-quantity';

/** Writes SI values in the reader's units, always with the unit. The only place of a report that prints a number. */
export class Figures {
  private readonly units: 'SI' | 'US';

  constructor(units: 'SI' | 'US') {
    this.units = units;
  }

  parts(value: number, unit: string): { readonly text: string; readonly unit: string } {
    return formatQuantity(value, unit, this.units);
  }

  quantity(value: number, unit: string): string {
    const { text, unit: shown } = this.parts(value, unit);
    return shown === '' ? text : `${text} ${shown}`;
  }

  /** The figure alone, for columns and axes that name the unit at their head. */
  bare(value: number, unit: string): string {
    return this.parts(value, unit).text;
  }

  /** The unit a quantity is shown in. */
  unit(unit: string): string {
    return this.parts(1, unit).unit;
  }

  /** An estimate in words: figure and unit, why it never comes, or a dash where it could not be computed. */
  estimate(estimate: Estimate | undefined): string {
    if (estimate === undefined) return '–';
    if (estimate.value === null) return 'never';
    return this.quantity(estimate.value, estimate.unit);
  }

  /** As {@link estimate}, without the unit. */
  bareEstimate(estimate: Estimate | undefined): string {
    if (estimate === undefined) return '–';
    return estimate.value === null ? 'never' : this.bare(estimate.value, estimate.unit);
  }

  /** A mass or a size as it was entered, without rounding to three figures. */
  asEntered(value: number, unit: string): string {
    const { text, unit: shown } = formatQuantity(value, unit, this.units, { figures: 'as entered' });
    return shown === '' ? text : `${text} ${shown}`;
  }

  /** The value as it is drawn on an axis in the reader's unit. */
  onAxis(value: number, unit: string): number {
    const shown = displayUnit(unit, this.units);
    return shown === undefined ? value : convert(value, unit, shown.key);
  }
}
