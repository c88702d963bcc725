import { convert } from './convert.ts';
import { displayUnit } from './display-unit.ts';
import { formatNumber } from './format-number.ts';
import type { UnitSystem } from './unit-system.ts';

export interface FormattedQuantity {
  readonly text: string;
  /** The unit as a person reads it; shown with the text, always. Empty only for a pure number. */
  readonly unit: string;
}

interface FormatOptions {
  /** Three significant figures for results; `as entered` for what a person put in (masses, sizes). */
  readonly figures?: 3 | 'as entered';
}

/** Enough to give back what was typed, few enough to hide the noise of a conversion. */
const ENTERED_FIGURES = 7;

function numberText(value: number, options: FormatOptions): string {
  if (options.figures !== 'as entered') return formatNumber(value, 3);
  const text = formatNumber(value, ENTERED_FIGURES);
  return text.includes('.') && !text.includes('×') ? text.replace(/\.?0+$/, '') : text;
}

/** Seconds as hours, minutes and seconds; the smallest part is the unit. Below a minute three significant figures. */
function duration(seconds: number): FormattedQuantity {
  const sign = seconds < 0 ? '−' : '';
  const whole = Math.round(Math.abs(seconds));
  if (whole < 60) return { text: formatNumber(seconds, 3), unit: 's' };
  if (whole < 3600) return { text: `${sign}${Math.floor(whole / 60)} min ${whole % 60}`, unit: 's' };
  const minutes = Math.round(whole / 60);
  return { text: `${sign}${Math.floor(minutes / 60)} h ${minutes % 60}`, unit: 'min' };
}

/**
 * A value kept in SI as a person reads it: converted into their units, rounded to three significant figures, thousands
 * apart, never without its unit. `s` becomes minutes and seconds. A unit the table does not have is shown as it is.
 *
 * @param value in `unit`; a value that is not finite is shown as a dash
 * @param unit as the tally writes it: `MJ/m2`, `kW`, `m^½`
 */
export function formatQuantity(
  value: number,
  unit: string,
  system: UnitSystem,
  options: FormatOptions = {},
): FormattedQuantity {
  if (unit === 's' && Number.isFinite(value) && options.figures !== 'as entered') return duration(value);
  const shown = displayUnit(unit, system);
  if (shown === undefined) return { text: numberText(value, options), unit };
  return { text: numberText(convert(value, unit, shown.key), options), unit: shown.symbol };
}
