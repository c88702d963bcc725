import { NotFoundError, OfflineError, ProblemError, StaleError } from '../../../lib/api-errors.ts';

export interface LimitFailure {
  readonly title: string;
  readonly text: string;
}

/** Why a limit could not be changed, what is kept, and what to do. A fault nobody foresaw is passed on. */
export function limitFailure(error: unknown): LimitFailure {
  if (error instanceof StaleError)
    return {
      title: 'Somebody has changed this limit meanwhile',
      text: 'Nothing of yours was saved over it. It is shown here as it is now; look at it and try again.',
    };
  if (error instanceof NotFoundError)
    return { title: 'This limit is not there any more', text: 'Somebody has taken it away. The list is read anew.' };
  if (error instanceof OfflineError)
    return {
      title: 'The server cannot be reached',
      text: 'Limits are set only with a connection. Nothing was changed.',
    };
  if (error instanceof ProblemError) return { title: 'The limit was not changed', text: error.problem.detail };
  throw error;
}
