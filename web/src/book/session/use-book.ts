import { useSyncExternalStore } from 'react';
import type { BookState } from './book-state.ts';
import { useBookSession } from './use-book-session.ts';

/**
 * Reads one part of the Book and re-renders only when it changes (compared with `Object.is`).
 * @param selector Must return a part of the state or a primitive, not a fresh object.
 */
export function useBook<T>(selector: (state: BookState) => T): T {
  const session = useBookSession();
  return useSyncExternalStore(session.subscribe, () => selector(session.state));
}
