/** What went wrong, in terms of the work; `http/error-response.ts` turns it into a status. */
export type FaultKind =
  | 'malformed'
  | 'not-signed-in'
  | 'forbidden'
  | 'not-found'
  | 'conflict'
  | 'stale'
  | 'too-large'
  | 'wrong-media'
  | 'invalid'
  | 'precondition-missing'
  | 'too-many'
  | 'unavailable'
  | 'full';

/** One fault of an input: where (a JSON pointer), which kind, and a sentence for the person. */
export interface InputFault {
  readonly pointer: string;
  readonly code: string;
  readonly message: string;
}

interface FaultParts {
  readonly errors?: readonly InputFault[];
  readonly retryAfter_s?: number;
  /** Members of the answer beside the usual ones, such as `clashes`. */
  readonly extra?: Readonly<Record<string, unknown>>;
}

/**
 * A refusal a person can do something about. `code` names the problem type; `detail` says what happened, what is kept
 * and what to do.
 */
export class Fault extends Error {
  readonly kind: FaultKind;
  readonly code: string;
  readonly detail: string;
  readonly errors: readonly InputFault[] | undefined;
  readonly retryAfter_s: number | undefined;
  readonly extra: Readonly<Record<string, unknown>>;

  constructor(kind: FaultKind, code: string, detail: string, parts: FaultParts = {}) {
    super(`${code}: ${detail}`);
    this.name = 'Fault';
    this.kind = kind;
    this.code = code;
    this.detail = detail;
    this.errors = parts.errors;
    this.retryAfter_s = parts.retryAfter_s;
    this.extra = parts.extra ?? {};
  }

  static notFound(): Fault {
    return new Fault('not-found', 'not-found', 'There is nothing here, or you have no role on the site it belongs to.');
  }

  static invalid(errors: readonly InputFault[], detail?: string): Fault {
    const first = errors[0]?.message ?? 'Something in it does not fit.';
    const rest = errors.length > 1 ? ` It is one of ${errors.length} faults.` : '';
    return new Fault('invalid', 'invalid-input', detail ?? `Nothing was changed. ${first}${rest}`, { errors });
  }
}
