import { useMemo } from 'react';
import { type Calculation, useCalculation } from './use-calculation.ts';
import { useRoomInput } from './use-room-input.ts';

/**
 * Which entry of a room ignites which, worked out in the background once the survey is quiet.
 * @param firstEntry id of the entry that burns first; null looks for the worst one
 */
export function useRoomSpread(roomId: string | null, firstEntry: string | null): Calculation<'spread'> {
  const input = useRoomInput(roomId);
  const task = useMemo(
    () =>
      input === null
        ? null
        : { kind: 'spread' as const, input: { ...input, options: { ...input.options, first_entry: firstEntry } } },
    [input, firstEntry],
  );
  return useCalculation(task);
}
