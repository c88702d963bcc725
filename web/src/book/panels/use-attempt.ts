import type { Done, Refusal } from '@embertally/shared/survey/command';
import { useState } from 'react';

interface Attempt<V> {
  /** What the survey said when it was tried. */
  readonly base: V;
  readonly tried: V;
  readonly message: string;
}

export interface AttemptField<V> {
  readonly value: V;
  readonly error: string | undefined;
  readonly commit: (next: V) => void;
}

/**
 * A field that writes through a command. What was refused stays in the field beside the reason until it is changed, or
 * until the survey itself changes under it.
 */
export function useAttempt<V>(value: V, run: (next: V) => Done | Refusal): AttemptField<V> {
  const [attempt, setAttempt] = useState<Attempt<V> | null>(null);
  const standing = attempt !== null && Object.is(attempt.base, value) ? attempt : null;
  return {
    value: standing === null ? value : standing.tried,
    error: standing?.message,
    commit: (next) => {
      if (Object.is(next, value)) {
        setAttempt(null);
        return;
      }
      const result = run(next);
      setAttempt(result.refused ? { base: value, tried: next, message: result.message } : null);
    },
  };
}
