import { createContext } from 'react';

/** The number whose working is asked for. */
export interface WorkingAsked {
  readonly path: string;
  readonly name: string;
}

/** Opens the working of a number; null where workings are already laid out, as on the workings page. */
export const WorkingContext = createContext<((asked: WorkingAsked) => void) | null>(null);
