import { ELEMENTS, type Atoms } from './atoms.ts';
import { parseFormula } from './parse-formula.ts';

export interface CombustionEquation {
  readonly formula: string;
  readonly fuel: Atoms;
  /** Moles of fuel it is written for. */
  readonly moles: number;
  readonly oxygen: number;
  /** As marked by (g) or (l) behind the water; null where nothing is marked. */
  readonly water: 'vapour' | 'liquid' | null;
}

export type ReadEquation =
  { readonly ok: true; readonly equation: CombustionEquation } | { readonly ok: false; readonly message: string };

interface Term {
  readonly moles: number;
  readonly formula: string;
  readonly atoms: Atoms;
  readonly state: string | null;
}

const BALANCE = 1e-6;

/**
 * Reads an equation of combustion such as `2 C8H18 + 25 O2 -> 16 CO2 + 18 H2O(g)`: one fuel and oxygen on the left, products
 * on the right, coefficients whole, decimal (with a point) or as a fraction. It has to balance.
 */
export function readEquation(text: string): ReadEquation {
  const sides = text.split(/->|→|⟶|=>|=/);
  if (sides.length !== 2)
    return { ok: false, message: 'Write the equation with one arrow: 2 C8H18 + 25 O2 -> 16 CO2 + 18 H2O(g).' };
  const terms: (readonly Term[])[] = [];
  for (const side of sides) {
    const read = readSide(side);
    if (typeof read === 'string') return { ok: false, message: read };
    terms.push(read);
  }
  const [left = [], right = []] = terms;
  const unbalanced = ELEMENTS.filter((element) => Math.abs(count(left, element) - count(right, element)) > BALANCE);
  if (unbalanced.length > 0)
    return {
      ok: false,
      message: `The equation does not balance in ${unbalanced.map((element) => `${element} (${count(left, element)} left, ${count(right, element)} right)`).join(', ')}.`,
    };
  const oxygen = left.filter(isOxygen);
  const fuels = left.filter((term) => !isOxygen(term));
  const [fuel] = fuels;
  if (fuel === undefined || fuels.length > 1)
    return { ok: false, message: 'Write one fuel and oxygen on the left side, without nitrogen of the air.' };
  if (oxygen.length === 0) return { ok: false, message: 'There is no oxygen (O2) on the left side.' };
  return {
    ok: true,
    equation: {
      formula: fuel.formula,
      fuel: fuel.atoms,
      moles: fuel.moles,
      oxygen: oxygen.reduce((sum, { moles }) => sum + moles, 0),
      water: waterState(right),
    },
  };
}

/** The terms of one side, or why they cannot be read. */
function readSide(side: string): readonly Term[] | string {
  const terms: Term[] = [];
  for (const piece of side.split('+')) {
    const match = /^\s*(\d+(?:\.\d+)?(?:\s*\/\s*\d+)?)?\s*(.*?)\s*(?:\((g|l|s|aq)\))?\s*$/i.exec(piece);
    const [, coefficient, formula = '', state] = match ?? [];
    const parsed = parseFormula(formula);
    if (!parsed.ok) return `“${piece.trim()}” cannot be read: ${parsed.message}`;
    const moles = coefficient === undefined ? 1 : fraction(coefficient);
    if (!(moles > 0 && Number.isFinite(moles))) return `“${piece.trim()}” needs a number of moles above 0.`;
    terms.push({ moles, formula, atoms: parsed.atoms, state: state?.toLowerCase() ?? null });
  }
  return terms;
}

function fraction(text: string): number {
  const [over = '', under = '1'] = text.split('/');
  return Number(over) / Number(under);
}

function count(terms: readonly Term[], element: keyof Atoms): number {
  return terms.reduce((sum, { moles, atoms }) => sum + moles * atoms[element], 0);
}

function isOxygen({ atoms }: Term): boolean {
  return atoms.O === 2 && ELEMENTS.every((element) => element === 'O' || atoms[element] === 0);
}

function waterState(products: readonly Term[]): CombustionEquation['water'] {
  const water = products.find(
    ({ atoms }) => atoms.H === 2 && atoms.O === 1 && ELEMENTS.every((one) => one === 'H' || one === 'O' || !atoms[one]),
  );
  if (water?.state === 'g') return 'vapour';
  return water?.state === 'l' ? 'liquid' : null;
}
