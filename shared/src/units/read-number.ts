/** Which mark a person or a file uses before the decimals; null: not known. */
export type DecimalMark = 'point' | 'comma' | null;

export type ReadNumber =
  | { readonly kind: 'number'; readonly value: number }
  | { readonly kind: 'not a number' }
  /** One separator with three digits after it, where it may group thousands or start the decimals. */
  | { readonly kind: 'ambiguous'; readonly grouped: number; readonly decimal: number };

const FRACTIONS: Readonly<Record<string, string>> = {
  '½': '1/2',
  '¼': '1/4',
  '¾': '3/4',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
};

/** Grouped in threes by the same mark throughout: `1 200`, `1,234,567`. */
function ungrouped(text: string, mark: string): string | undefined {
  const groups = text.split(mark);
  const [first = '', ...rest] = groups;
  if (!/^\d{1,3}$/.test(first) || !rest.every((group) => /^\d{3}$/.test(group))) return undefined;
  return groups.join('');
}

/** `6 1/2`, `1/2`, `6½` */
function fraction(text: string): number | undefined {
  const spelled = text.replaceAll(/[½¼¾⅛⅜⅝⅞]/g, (sign) => ` ${FRACTIONS[sign] ?? ''}`).trim();
  const match = /^(?:(\d+) +)?(\d+)\/(\d+)$/.exec(spelled);
  if (match === null) return undefined;
  const [, whole = '0', numerator, denominator] = match;
  return Number(denominator) === 0 ? undefined : Number(whole) + Number(numerator) / Number(denominator);
}

/** Both marks present: the later one starts the decimals, the earlier groups thousands. */
function withBothMarks(text: string): string | undefined {
  const decimal = text.lastIndexOf(',') > text.lastIndexOf('.') ? ',' : '.';
  const [whole = '', decimals = '', ...more] = text.split(decimal);
  const digits = ungrouped(whole, decimal === ',' ? '.' : ',');
  if (digits === undefined || more.length > 0 || !/^\d+$/.test(decimals)) return undefined;
  return `${digits}.${decimals}`;
}

function decimals(digits: string | undefined, exponent: string): ReadNumber {
  if (digits === undefined || !/^(\d+\.?\d*|\.\d+)$/.test(digits)) return { kind: 'not a number' };
  const value = Number(digits + exponent);
  return Number.isFinite(value) ? { kind: 'number', value } : { kind: 'not a number' };
}

function unsigned(text: string, decimal: DecimalMark): ReadNumber {
  const part = fraction(text);
  if (part !== undefined) return { kind: 'number', value: part };

  const match = /^(\d{1,3}(?: \d{3})+(?!\d)|\d*)([.,\d]*)(e[+-]?\d{1,3})?$/i.exec(
    text.replaceAll(/[\u00a0\u2009\u202f]/g, ' '),
  );
  if (match === null) return { kind: 'not a number' };
  const [, lead = '', tail = '', exponent = ''] = match;
  const plain = lead.replaceAll(' ', '') + tail;
  const commas = plain.split(',').length - 1;
  const points = plain.split('.').length - 1;
  if (commas > 0 && points > 0) return decimals(withBothMarks(plain), exponent);
  if (commas > 1) return decimals(ungrouped(plain, ','), exponent);
  if (points > 1) return decimals(ungrouped(plain, '.'), exponent);

  const mark = commas === 1 ? 'comma' : 'point';
  const sign = mark === 'comma' ? ',' : '.';
  const asDecimal = plain.replace(',', '.');
  const mayGroup = !lead.includes(' ') && exponent === '' && /^[1-9]\d{0,2}[.,]\d{3}$/.test(plain);
  const known = decimal ?? (mark === 'point' ? 'point' : null);
  if (!mayGroup || known === mark) return decimals(asDecimal, exponent);
  if (known !== null) return decimals(plain.replace(sign, ''), exponent);
  return { kind: 'ambiguous', grouped: Number(plain.replace(sign, '')), decimal: Number(asDecimal) };
}

/**
 * A number as people write it: `12.5`, `12,5`, `1 200`, `1,234.5`, `6 1/2`, `−3`, `1e3`. A lone comma with three digits
 * after it is ambiguous unless `decimal` says which mark starts the decimals; a lone point starts the decimals unless
 * `decimal` is `comma`.
 */
export function readNumber(text: string, decimal: DecimalMark = null): ReadNumber {
  const trimmed = text.trim();
  const negative = /^[-−]\s*/.exec(trimmed);
  const result = unsigned(trimmed.replace(/^[-−+]\s*/, ''), decimal);
  if (negative === null || result.kind === 'not a number') return result;
  if (result.kind === 'number') return { kind: 'number', value: -result.value };
  return { kind: 'ambiguous', grouped: -result.grouped, decimal: -result.decimal };
}
