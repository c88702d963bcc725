import { createContext } from 'react';
import type { BookSession } from './book-session.ts';

export const BookContext = createContext<BookSession | null>(null);
