import { createContext } from 'react';
import { browserThread, type CalculationThread } from './calculation-thread.ts';

/** Where background calculations run: threads of the browser, or something else where it has none. */
export const CalculationContext = createContext<() => CalculationThread>(browserThread);
