import { USUAL_SAMPLING } from '@embertally/shared/uncertainty/usual-sampling';
import { useMemo } from 'react';
import { type Calculation, useCalculation } from './use-calculation.ts';
import { useRoomInput } from './use-room-input.ts';

/** How sure the numbers of a room are, sampled in the background once the survey is quiet. */
export function useRoomUncertainty(roomId: string | null): Calculation<'uncertainty'> {
  const input = useRoomInput(roomId);
  const task = useMemo(
    () =>
      input === null
        ? null
        : { kind: 'uncertainty' as const, input: { ...input, options: { ...input.options, ...USUAL_SAMPLING } } },
    [input],
  );
  return useCalculation(task);
}
