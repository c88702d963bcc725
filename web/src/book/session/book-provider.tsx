import type { ReactNode } from 'react';
import { BookContext } from './book-context.ts';
import type { BookSession } from './book-session.ts';

/** Puts one open survey within reach of `useBook` and `useBookSession`. */
export function BookProvider({ session, children }: { session: BookSession; children: ReactNode }) {
  return <BookContext value={session}>{children}</BookContext>;
}
