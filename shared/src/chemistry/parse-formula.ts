import { ELEMENTS, type Atoms, type Element } from './atoms.ts';

export type ParsedFormula =
  { readonly ok: true; readonly atoms: Atoms } | { readonly ok: false; readonly at: number; readonly message: string };

const LONGEST = 200;
const MOST_ATOMS = 100_000;
const DEEPEST = 20;
const SUBSCRIPTS = '₀₁₂₃₄₅₆₇₈₉';

class FormulaFault extends Error {
  constructor(
    readonly at: number,
    message: string,
  ) {
    super(message);
  }
}

type Counts = Record<Element, number>;

const none = (): Counts => ({ C: 0, H: 0, O: 0, N: 0, S: 0, F: 0, Cl: 0, Br: 0 });

function add(into: Counts, from: Counts, times: number): void {
  for (const element of ELEMENTS) into[element] += from[element] * times;
}

/**
 * Reads a chemical formula: `C8H18`, `CH3(CH2)6CH3`, `C6H12O6·H2O`, `C₂H₅OH`, a mean composition as `CH1.44O0.66`, a repeat
 * unit as `(C2H4)n`. A number in front is refused: it counts moles of an equation, not atoms.
 */
export function parseFormula(text: string): ParsedFormula {
  const plain = [...text].map((sign) => (SUBSCRIPTS.includes(sign) ? SUBSCRIPTS.indexOf(sign) : sign)).join('');
  if (plain.trim() === '') return { ok: false, at: 0, message: 'The formula is empty. Write one such as C8H18.' };
  if (plain.length > LONGEST)
    return { ok: false, at: LONGEST, message: `The formula is longer than ${LONGEST} characters.` };
  try {
    return { ok: true, atoms: readFormula(plain) };
  } catch (fault) {
    if (fault instanceof FormulaFault) return { ok: false, at: fault.at, message: fault.message };
    throw fault;
  }
}

function readFormula(text: string): Atoms {
  let at = 0;
  const total = none();
  skipBlanks();
  if (/\d/.test(text[at] ?? ''))
    throw new FormulaFault(
      at,
      'A number in front counts moles. Write the formula of one mole alone and the moles in their own field.',
    );
  add(total, readGroup(0), 1);
  while (at < text.length) {
    if (!/[·*•]/.test(text[at] ?? '')) throw new FormulaFault(at, closing(text[at] ?? ''));
    at += 1;
    skipBlanks();
    const times = readNumber() ?? 1;
    add(total, readGroup(0), times);
  }
  for (const element of ELEMENTS) {
    if (total[element] > MOST_ATOMS)
      throw new FormulaFault(0, `More than ${MOST_ATOMS} atoms of ${element}; write the repeat unit instead.`);
  }
  return total;

  function skipBlanks(): void {
    while (/\s/.test(text[at] ?? '')) at += 1;
  }

  /** A run of elements and brackets, up to a closing bracket, a dot or the end. */
  function readGroup(depth: number): Counts {
    const start = at;
    const counts = none();
    let parts = 0;
    for (skipBlanks(); at < text.length; skipBlanks()) {
      const sign = text[at] ?? '';
      if (sign === '(' || sign === '[') add(counts, readBracket(depth, sign), readTimes());
      else if (/[A-Za-z]/.test(sign)) counts[readElement()] += readTimes();
      else if (/[)\]·*•]/.test(sign)) break;
      else throw new FormulaFault(at, stray(sign));
      parts += 1;
    }
    if (parts === 0) throw new FormulaFault(start, 'There is nothing between the brackets or after the dot.');
    return counts;
  }

  function readBracket(depth: number, opening: '(' | '['): Counts {
    const start = at;
    if (depth >= DEEPEST) throw new FormulaFault(at, `Brackets are nested more than ${DEEPEST} deep.`);
    at += 1;
    const inner = readGroup(depth + 1);
    if (text[at] !== (opening === '(' ? ')' : ']'))
      throw new FormulaFault(start, `The bracket ${opening} is not closed.`);
    at += 1;
    if (text[at] === 'n') at += 1;
    return inner;
  }

  function readElement(): Element {
    const two = text.slice(at, at + 2);
    const one = text[at] ?? '';
    const lower = /^[A-Z][a-z]$/.test(two);
    const found = ELEMENTS.find((element) => element === (lower ? two : one));
    if (!found) throw new FormulaFault(at, unknownElement(lower ? two : one));
    at += found.length;
    return found;
  }

  function readTimes(): number {
    const start = at;
    const times = readNumber() ?? 1;
    if (times === 0) throw new FormulaFault(start, 'A count of 0 says nothing; leave the element out.');
    return times;
  }

  function readNumber(): number | undefined {
    const digits = /^\d+(\.\d+)?/.exec(text.slice(at))?.[0];
    if (digits === undefined) return undefined;
    const value = Number(digits);
    if (value > MOST_ATOMS) throw new FormulaFault(at, `${digits} is more than ${MOST_ATOMS}.`);
    at += digits.length;
    return value;
  }
}

function closing(sign: string): string {
  return /[)\]]/.test(sign) ? `The bracket ${sign} was never opened.` : stray(sign);
}

function stray(sign: string): string {
  if (/[+\-−^]/.test(sign)) return 'Charges and signs are not read; write the neutral formula.';
  if (sign === ',') return 'Write a fraction with a point: CH1.44O0.66.';
  return `“${sign}” has no place in a formula.`;
}

function unknownElement(symbol: string): string {
  if (symbol === 'Co') return 'Co is cobalt, which is not covered. Write CO for carbon and oxygen.';
  if (/^[a-z]/.test(symbol)) return `“${symbol}” is no element: symbols begin with a capital letter.`;
  return `${symbol} is not covered. Heats are worked out for C, H, O, N, S, F, Cl and Br.`;
}
