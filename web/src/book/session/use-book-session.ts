import { useContext } from 'react';
import { BookContext } from './book-context.ts';
import type { BookSession } from './book-session.ts';

/** The open survey's session, to act on it. To read from it use `useBook`, which re-renders on change. */
export function useBookSession(): BookSession {
  const session = useContext(BookContext);
  if (session === null) throw new Error('useBookSession is used outside a BookProvider.');
  return session;
}
