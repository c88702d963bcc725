import { figure } from '@embertally/shared/methods/figure';
import { displayUnit } from '@embertally/shared/units/display-unit';

/** A value inside a working: SI, as the method is written, five significant figures; words stay words. */
export function workingFigure(value: number | string | null | undefined, unit = ''): string {
  if (value == null) return '–';
  const symbol = displayUnit(unit, 'SI')?.symbol ?? unit;
  const text = typeof value === 'number' ? figure(value).replace('-', '−') : value;
  return symbol === '' ? text : `${text} ${symbol}`;
}
