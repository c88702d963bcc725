import { figure } from '@embertally/shared/methods/figure';
import { displayUnit } from '@embertally/shared/units/display-unit';

/** A value inside a working: SI, as the method is written, five significant figures; words stay words. */
export function workingFigure(value: number | string | null | undefined, unit = ''): string {
  if (value == null) return '–';
  const symbol = displayUnit(unit, 'SI')?.symbol ?? setUnit(unit);
  const text = typeof value === 'number' ? figure(value).replace('-', '−') : value;
  return symbol === '' || text === 'none' ? text : `${text} ${symbol}`;
}

/** A unit outside the table, set as print sets it: `J/m2s1/2K` as J/m²s^½K. */
function setUnit(unit: string): string {
  return unit.replaceAll('1/2', '^½').replaceAll('m2', 'm²').replaceAll('m3', 'm³').replaceAll('s2', 's²');
}
