/** Narrow no-break space: groups of three digits stay on one line. */
const GROUP = '\u202f';
const SUPERSCRIPT = '⁰¹²³⁴⁵⁶⁷⁸⁹';

function grouped(digits: string): string {
  return digits.replaceAll(/\B(?=(\d{3})+(?!\d))/g, GROUP);
}

function power(exponent: number): string {
  const digits = [...String(Math.abs(exponent))].map((digit) => SUPERSCRIPT[Number(digit)]).join('');
  return `10${exponent < 0 ? '⁻' : ''}${digits}`;
}

/**
 * A number in words of digits: rounded to `figures` significant figures, thousands set apart by a thin space, a true
 * minus sign. Below 0.0001 and from 10¹⁵ in powers of ten. A value that is not finite is shown as a dash.
 */
export function formatNumber(value: number, figures: number): string {
  if (!Number.isFinite(value)) return '–';
  if (value === 0) return '0';
  const sign = value < 0 ? '−' : '';
  const [mantissa = '', exponentText = '0'] = Math.abs(value)
    .toExponential(figures - 1)
    .split('e');
  const exponent = Number(exponentText);
  if (exponent < -4 || exponent >= 15) return `${sign}${mantissa} × ${power(exponent)}`;
  const decimals = Math.max(0, figures - 1 - exponent);
  const [whole = '', fraction] = Number(`${mantissa}e${exponentText}`).toFixed(decimals).split('.');
  return `${sign}${grouped(whole)}${fraction === undefined ? '' : `.${fraction}`}`;
}
