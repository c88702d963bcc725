import type { Problem } from '@embertally/shared/contracts/problem';

/** The server could not be reached at all: nothing was answered, nothing is known to have changed. */
export class OfflineError extends Error {
  override readonly name = 'OfflineError';
  constructor(options?: ErrorOptions) {
    super('The server cannot be reached. What you typed is kept; try again when the network is back.', options);
  }
}

/** The server answered something the contract does not allow: a fault of the program, never of the person. */
export class ContractError extends Error {
  override readonly name = 'ContractError';
  constructor(
    readonly contractId: string,
    reason: string,
    options?: ErrorOptions,
  ) {
    super(`The server answered unexpectedly (${contractId}): ${reason}`, options);
  }
}

/** Any answer that is not 2xx, with its problem details. The classes below name those a screen treats differently. */
export class ProblemError extends Error {
  override readonly name: string = 'ProblemError';
  readonly status: number;
  constructor(
    readonly problem: Problem,
    /** Seconds the server asked to wait, where it said so. */
    readonly retryAfter_s: number | null = null,
  ) {
    super(problem.detail);
    this.status = problem.status;
  }
}

export class NotSignedInError extends ProblemError {
  override readonly name = 'NotSignedInError';
}
export class NotAllowedError extends ProblemError {
  override readonly name = 'NotAllowedError';
}
export class NotFoundError extends ProblemError {
  override readonly name = 'NotFoundError';
}
export class ConflictError extends ProblemError {
  override readonly name = 'ConflictError';
}
/** 412 or 428: somebody changed the thing since it was read. */
export class StaleError extends ProblemError {
  override readonly name = 'StaleError';
}
export class UnprocessableError extends ProblemError {
  override readonly name = 'UnprocessableError';
}
export class TooManyError extends ProblemError {
  override readonly name = 'TooManyError';
}
/** 5xx: the server is there and cannot answer now. */
export class ServerFailedError extends ProblemError {
  override readonly name = 'ServerFailedError';
}

const BY_STATUS: Readonly<Record<number, typeof ProblemError>> = {
  401: NotSignedInError,
  403: NotAllowedError,
  404: NotFoundError,
  409: ConflictError,
  412: StaleError,
  422: UnprocessableError,
  428: StaleError,
  429: TooManyError,
};

/** The error of a status: the named class where there is one, `ProblemError` otherwise. */
export function problemError(problem: Problem, retryAfter_s: number | null): ProblemError {
  const Class = BY_STATUS[problem.status] ?? (problem.status >= 500 ? ServerFailedError : ProblemError);
  return new Class(problem, retryAfter_s);
}
