import type { Estimate } from '@embertally/shared/methods/estimate';
import { createContext } from 'react';

/** The number whose working is asked for. */
export interface WorkingAsked {
  readonly path: string;
  readonly name: string;
  /** With its working in it, where it was worked out in the background; otherwise it is worked out when asked for. */
  readonly estimate?: Estimate;
}

/** Opens the working of a number; null where workings are already laid out, as on the workings page. */
export const WorkingContext = createContext<((asked: WorkingAsked) => void) | null>(null);
