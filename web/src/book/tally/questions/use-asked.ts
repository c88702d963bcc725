import type { RoomInput } from '@embertally/shared/tally/room-input';
import { useState } from 'react';

export interface Asked<T> {
  /** Null before anything was asked. */
  readonly answer: T | null;
  /** The room is not as it was when it was asked. */
  readonly isStale: boolean;
  readonly ask: (work: (input: RoomInput) => T) => void;
  /** Forgets the answer, as when the question itself changes. */
  readonly forget: () => void;
}

/**
 * An answer that belongs to the room as it was when it was asked. Searching takes some hundred milliseconds in a full room:
 * too long for every frame, so a changed room is asked again by the person.
 */
export function useAsked<T>(input: RoomInput): Asked<T> {
  const [asked, setAsked] = useState<{ readonly of: RoomInput; readonly answer: T } | null>(null);
  return {
    answer: asked?.answer ?? null,
    isStale: asked !== null && asked.of !== input,
    ask: (work) => {
      setAsked({ of: input, answer: work(input) });
    },
    forget: () => {
      setAsked(null);
    },
  };
}
