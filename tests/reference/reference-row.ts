export type Tolerance = { readonly rel: number } | { readonly abs: number };

/** One value from outside that a method has to meet. A number the code itself produced is never an expected value. */
export interface ReferenceRow {
  readonly id: string;
  /** Id of the method, without its version. */
  readonly method: string;
  readonly inputs: Readonly<Record<string, number | string | readonly number[]>>;
  /** By output name; `value` for a method of one result. */
  readonly expected: Readonly<Record<string, number | string | boolean | null>>;
  readonly tolerance: Tolerance;
  /** Printed in the source; computed by another implementation or by hand; or true of every right implementation. */
  readonly origin: 'published' | 'independent' | 'invariant';
  readonly source: string;
  /** The source was not read again when the value was written down. */
  readonly fromMemory?: true;
}
