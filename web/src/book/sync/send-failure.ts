import { clashSchema, type Clash } from '@embertally/shared/survey/change';
import { z } from 'zod/mini';
import { ConflictError, NotSignedInError, OfflineError, ProblemError } from '../../lib/api-errors.ts';

/** What to do about a change set that was not accepted. */
export type SendFailure =
  /** Nothing is wrong with the set: keep it and try again. */
  | { readonly kind: 'retry'; readonly why: 'offline' | 'signed-out' | 'server'; readonly after_s: number | null }
  /** The server will never take it as it is: it waits for the person, the others go on. */
  | { readonly kind: 'hold'; readonly reason: string; readonly clashes: readonly Clash[] };

const TRY_LATER = new Set([408, 425, 429]);
const clashes = z.array(clashSchema);

export function sendFailure(error: unknown): SendFailure {
  if (error instanceof OfflineError) return { kind: 'retry', why: 'offline', after_s: null };
  if (error instanceof NotSignedInError) return { kind: 'retry', why: 'signed-out', after_s: null };
  if (error instanceof ProblemError && error.status < 500 && !TRY_LATER.has(error.status)) {
    const parsed = error instanceof ConflictError ? clashes.safeParse(error.problem['clashes']) : null;
    return { kind: 'hold', reason: error.message, clashes: parsed?.success === true ? parsed.data : [] };
  }
  const after_s = error instanceof ProblemError ? error.retryAfter_s : null;
  return { kind: 'retry', why: 'server', after_s };
}
