import type { BarChart } from './bar-chart.ts';

/** A text as one field: quoted where it must be, and never read as a formula by a spreadsheet. */
function textField(text: string): string {
  const plain = /^[=+\-@\t\r]/.test(text) ? `'${text}` : text;
  return /[",\r\n]/.test(plain) ? `"${plain.replaceAll('"', '""')}"` : plain;
}

/** The bars as a file: RFC 4180, CRLF, point decimals, the unit in the column's name. */
export function barCsv({ column, bars }: BarChart): string {
  const rows = bars.map(({ label, value }) => [textField(label), String(Number(value.toPrecision(6)))]);
  return [['input', column], ...rows].map((fields) => `${fields.join(',')}\r\n`).join('');
}
