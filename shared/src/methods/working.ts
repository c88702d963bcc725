/** A flag that stands next to a number: outside a range, a default assumed, a caution. */
export interface EstimateWarning {
  readonly code: string;
  readonly text: string;
}

/** Where the value of an input came from; shown in every working. */
export type InputOrigin = 'given' | 'measured' | 'catalogue' | 'default' | 'computed';

export interface WorkingInput {
  readonly name: string;
  readonly symbol: string;
  readonly quantity: string;
  readonly unit: string;
  readonly value: number | string | null;
  readonly origin: InputOrigin;
  readonly note?: string;
  /** The range the method was made for, as text: `9 to 65`. */
  readonly valid?: string;
}

/** One line of a derivation, in the source's own symbols and order. */
export interface WorkingStep {
  readonly text: string;
  readonly equation?: string;
  readonly value?: number | string | null;
  readonly unit?: string;
}

export interface MethodSource {
  readonly title: string;
  readonly edition?: string;
  /** Clause, equation, table or page. */
  readonly locator: string;
  /** True when the value was taken from memory of the source, not read again. */
  readonly fromMemory?: boolean;
}
