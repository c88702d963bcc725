import { readNumber, type DecimalMark } from '../units/read-number.ts';

const PLAIN = /^[-+]?(?:\d+\.?\d*|\.\d+)(?:e[-+]?\d{1,3})?$/i;

/** Words instruments write where there was no reading. */
const NO_READING = /^(?:-+|n\/?a|nan|null|#n\/a|inf|-inf)$/i;

export type CellNumber = number | 'blank' | 'text' | 'ambiguous';

/** A cell as a number; a plain one with a point is read fast. */
export function cellNumber(cell: string, decimal: DecimalMark): CellNumber {
  if (cell === '') return 'blank';
  if (decimal !== 'comma' && PLAIN.test(cell)) {
    const value = Number(cell);
    return Number.isFinite(value) ? value : 'text';
  }
  if (NO_READING.test(cell)) return 'blank';
  const read = readNumber(cell, decimal);
  if (read.kind === 'number') return read.value;
  return read.kind === 'ambiguous' ? 'ambiguous' : 'text';
}

/** `0:07:20` or `7:20` as seconds; undefined for anything else. */
export function clockSeconds(cell: string): number | undefined {
  const match = /^(-)?(?:(\d{1,3}):)?(\d{1,3}):(\d{2}(?:[.,]\d+)?)$/.exec(cell);
  if (match === null) return undefined;
  const [, minus, hours = '0', minutes = '0', seconds = '0'] = match;
  const value = Number(hours) * 3600 + Number(minutes) * 60 + Number(seconds.replace(',', '.'));
  return minus === undefined ? value : -value;
}
