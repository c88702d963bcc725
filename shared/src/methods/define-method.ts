import type { MethodSource, WorkingStep } from './working.ts';

/** One number a method needs. `valid` is the range its source was made for, ends included. */
export interface NumberInput {
  readonly symbol: string;
  readonly unit: string;
  readonly quantity: string;
  readonly valid: readonly [number, number];
}

/** One number per item of a list (per entry, per opening, per surface); `valid` holds for each. */
export interface ListInput extends NumberInput {
  readonly list: true;
}

/** One of a few named cases. */
export interface ChoiceInput {
  readonly symbol: string;
  readonly quantity: string;
  readonly choices: readonly string[];
}

export type MethodInput = NumberInput | ListInput | ChoiceInput;
export type MethodInputs = Readonly<Record<string, MethodInput>>;

export type InputValues<S extends MethodInputs> = {
  readonly [K in keyof S]: S[K] extends { readonly choices: readonly (infer C)[] }
    ? C
    : S[K] extends { readonly list: true }
      ? readonly number[]
      : number;
};

export interface MethodOutput {
  readonly symbol: string;
  readonly unit: string;
  readonly quantity: string;
}

interface Declaration<S extends MethodInputs, R> {
  /** Topic and name; the edition's year where editions differ: `load.design-2002`. */
  readonly id: string;
  /** Rises when the same inputs give another result. */
  readonly version: number;
  readonly title: string;
  readonly symbol: string;
  readonly unit: string;
  readonly inputs: S;
  /** The relation as the source prints it, in its own symbols and order. */
  readonly equation: string;
  readonly sources: readonly [MethodSource, ...MethodSource[]];
  readonly assumptions: readonly string[];
  /** Why this relation and not another one for the same quantity. */
  readonly why: string;
  /** Outside a range: compute and say so, or do not compute. */
  readonly outOfRange: 'warn' | 'refuse';
  /** Several numbers of one run, by the name of the result's field. */
  readonly outputs?: Readonly<Record<string, MethodOutput>>;
  run(inputs: InputValues<S>): R;
  /** Steps between equation and result; called for workings only. */
  explain?(inputs: InputValues<S>, result: R): readonly WorkingStep[];
}

export interface Method<S extends MethodInputs = MethodInputs, R = number> extends Declaration<S, R> {
  /** `id@version`, as printed beside every number. */
  readonly ref: string;
}

/** What lists and tables of methods need; every method fits. */
export type MethodSummary = Pick<
  Method,
  | 'id'
  | 'version'
  | 'ref'
  | 'title'
  | 'symbol'
  | 'unit'
  | 'inputs'
  | 'outputs'
  | 'equation'
  | 'sources'
  | 'assumptions'
  | 'why'
  | 'outOfRange'
>;

/** Declares one published relation. The result's field names are its outputs when it has several. */
export function defineMethod<const S extends MethodInputs, R>(declaration: Declaration<S, R>): Method<S, R> {
  return Object.freeze({ ...declaration, ref: `${declaration.id}@${declaration.version}` });
}
