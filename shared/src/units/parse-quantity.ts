import { convert } from './convert.ts';
import { displayUnit } from './display-unit.ts';
import { findUnit } from './find-unit.ts';
import { formatQuantity } from './format-quantity.ts';
import { readNumber, type DecimalMark } from './read-number.ts';
import type { UnitSystem } from './unit-system.ts';
import type { Unit } from './unit-table.ts';

export interface QuantityField {
  /** The unit the value is kept in, SI: `m`, `kg`, `MJ/m2`. */
  readonly unit: string;
  /** A plain number is in this person's unit. */
  readonly system: UnitSystem;
  /** What the field is called, as its label reads: `Width`. */
  readonly name: string;
  /** Bounds in `unit`, both admitted. */
  readonly minimum?: number;
  readonly maximum?: number;
  /** The answer to an earlier question about `1,234`, or what a file is known to use. */
  readonly decimal?: DecimalMark;
}

export interface QuantityChoice {
  readonly text: string;
  readonly decimal: 'point' | 'comma';
  /** In the field's unit. */
  readonly value: number;
}

export type ParsedQuantity =
  | { readonly ok: true; readonly value: number }
  | {
      readonly ok: false;
      readonly code: 'empty' | 'not a number' | 'unknown unit' | 'wrong unit' | 'ambiguous' | 'out of range';
      readonly message: string;
      /** What an ambiguous number may mean; to be asked. */
      readonly choices?: readonly QuantityChoice[];
    };

type Refusal = Extract<ParsedQuantity, { ok: false }>;

/** A number and the unit behind it, as `7 ft` in `7 ft 10 in`. */
interface Piece {
  readonly number: string;
  readonly unit: string;
}

const VULGAR = '½¼¾⅛⅜⅝⅞';
/** A run of digits, marks, blanks and fractions; an exponent only where no word goes on behind it. */
const NUMBER = String.raw`[-−+]?\s*[\d.,${VULGAR}](?:[\d.,\s${VULGAR}]|/(?=\d))*(?:e[+-]?\d+(?![a-z]))?`;
/** What is not a digit, and the 2 or 3 of `m2` and `ft3` when it stands right behind a letter and ends the word. */
const UNIT = String.raw`(?:[^\d${VULGAR}]|(?<=[a-z])[23](?=$|[\s/)]))*`;
const PIECE = new RegExp(`(${NUMBER})(${UNIT})`, 'giy');
const LONGEST = 60;

/** Splits `7 ft 10 in` into its pieces; undefined when something is left over. */
function pieces(text: string): readonly Piece[] | undefined {
  const found = [...text.matchAll(PIECE)];
  const covered = found.reduce((length, [piece]) => length + piece.length, 0);
  if (found.length === 0 || covered < text.length) return undefined;
  return found.map(([, number = '', unit = '']) => ({ number: number.trim(), unit: unit.trim() }));
}

function lowerFirst(name: string): string {
  return /^[A-Z][a-z ]/.test(name) ? name.charAt(0).toLowerCase() + name.slice(1) : name;
}

/**
 * Reads what a person typed into a field of one quantity: `12.5`, `12,5`, `1 200`, `2.4 m`, `2400mm`, `7 ft 10 in`,
 * `5' 6 1/2"`, `1 h 20 min`. A plain number is in the unit the person reads. `1,234` is refused with a question. Nothing
 * is guessed and nothing is rounded: a refusal says what is wrong and what to write.
 *
 * @returns the value in `field.unit`, or a message to show with the field
 * @throws RangeError when `field.unit` is not in the unit table
 */
export function parseQuantity(text: string, field: QuantityField): ParsedQuantity {
  const shown = displayUnit(field.unit, field.system);
  if (shown === undefined) throw new RangeError(`No unit is written “${field.unit}”.`);
  const notANumber: Refusal = {
    ok: false,
    code: 'not a number',
    message: `${field.name} must be a number, like 12.5 or 12.5 ${shown.symbol}`,
  };
  const trimmed = text.trim();
  if (trimmed === '') return { ok: false, code: 'empty', message: `Enter the ${lowerFirst(field.name)}` };
  const found = trimmed.length > LONGEST ? undefined : pieces(trimmed);
  if (found === undefined) return notANumber;

  let total = 0;
  let previous: Unit | undefined;
  for (const [index, piece] of found.entries()) {
    const unit = unitOf(piece, previous, shown);
    if (unit === undefined) return unknownUnit(piece.unit, shown, field);
    if (unit.dimension !== shown.dimension) return wrongUnit(unit, shown, field);
    // `2 m 3 m` or `4 in 2 ft` is a slip, not a sum; so is a minus sign after the first piece.
    if (previous !== undefined && unit.factor >= previous.factor) return notANumber;
    if (index > 0 && (/^[-−+]/.test(piece.number) || unit.dimension === 'temperature')) return notANumber;
    const read = readNumber(piece.number, field.decimal ?? null);
    if (read.kind === 'not a number') return notANumber;
    if (read.kind === 'ambiguous') return found.length === 1 ? ambiguous(piece, read, unit, field) : notANumber;
    const value = convert(read.value, unit.key, field.unit);
    total += isNegative(found) && index > 0 ? -value : value;
    previous = unit;
  }
  return withinBounds(total, field);
}

function isNegative(found: readonly Piece[]): boolean {
  return /^[-−]/.test(found[0]?.number ?? '');
}

/** A bare number behind feet is inches (`5' 6`), behind pounds ounces, behind hours minutes; a bare first is the person's. */
function unitOf(piece: Piece, previous: Unit | undefined, shown: Unit): Unit | undefined {
  if (piece.unit !== '') return findUnit(piece.unit);
  if (previous === undefined) return shown;
  const next: Readonly<Record<string, string>> = { ft: 'in', lb: 'oz', h: 'min', min: 's' };
  return findUnit(next[previous.key] ?? '');
}

function unknownUnit(unit: string, shown: Unit, field: QuantityField): Refusal {
  if (unit === '') return { ok: false, code: 'not a number', message: `${field.name} must be one number, like 12.5` };
  return {
    ok: false,
    code: 'unknown unit',
    message: `${field.name}: “${unit}” is not a unit known here. Enter a number, like 12.5 ${shown.symbol}`,
  };
}

function wrongUnit(unit: Unit, shown: Unit, field: QuantityField): Refusal {
  return {
    ok: false,
    code: 'wrong unit',
    message: `${field.name} is measured in ${shown.symbol}, like 12.5 ${shown.symbol}; ${unit.symbol} is a unit of ${unit.dimension}`,
  };
}

function ambiguous(
  piece: Piece,
  read: { readonly grouped: number; readonly decimal: number },
  unit: Unit,
  field: QuantityField,
): Refusal {
  const comma = piece.number.includes(',');
  const choices: readonly QuantityChoice[] = [
    {
      text: `${read.grouped} ${unit.symbol}`,
      decimal: comma ? 'point' : 'comma',
      value: convert(read.grouped, unit.key, field.unit),
    },
    {
      text: `${read.decimal} ${unit.symbol}`,
      decimal: comma ? 'comma' : 'point',
      value: convert(read.decimal, unit.key, field.unit),
    },
  ];
  return {
    ok: false,
    code: 'ambiguous',
    message: `${field.name}: does “${piece.number}” mean ${read.grouped} or ${read.decimal}? Enter it without the separator, or with all decimals`,
    choices,
  };
}

function withinBounds(value: number, field: QuantityField): ParsedQuantity {
  const { minimum, maximum } = field;
  const write = (bound: number) => {
    const { text, unit } = formatQuantity(bound, field.unit, field.system, { figures: 'as entered' });
    return `${text} ${unit}`;
  };
  const refuse = (message: string): Refusal => ({ ok: false, code: 'out of range', message });
  const below = minimum !== undefined && value < minimum;
  const above = maximum !== undefined && value > maximum;
  if (!below && !above) return { ok: true, value };
  if (minimum !== undefined && maximum !== undefined) {
    return refuse(`${field.name} must be between ${write(minimum)} and ${write(maximum)}`);
  }
  return minimum !== undefined
    ? refuse(`${field.name} must be ${write(minimum)} or more`)
    : refuse(`${field.name} must be ${write(maximum ?? value)} or less`);
}
