import type { UnitSystem } from '@embertally/shared/units/unit-system';
import { createContext, useContext } from 'react';

export type { UnitSystem };

/** The units the person who is signed in reads in. SI until somebody has said otherwise. */
export const UnitsContext = createContext<UnitSystem>('SI');

export function useUnits(): UnitSystem {
  return useContext(UnitsContext);
}
