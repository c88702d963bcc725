import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { useCallback } from 'react';
import { useUnits } from './units-context.ts';

export interface Shown {
  readonly text: string;
  readonly unit: string;
}

/** Gives a function that writes an SI value in the person's units: three significant figures, the unit always with it. */
export function useQuantity(): (value: number, unit: string) => Shown {
  const units = useUnits();
  return useCallback((value: number, unit: string) => formatQuantity(value, unit, units), [units]);
}
