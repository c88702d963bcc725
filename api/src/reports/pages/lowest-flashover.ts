import type { RoomTally } from '@embertally/shared/tally/room-tally';

export const FLASHOVER_NAMES = {
  thomas: 'Thomas',
  babrauskas: 'Babrauskas',
  mqh: 'McCaffrey, Quintiere and Harkleroad',
} as const;

/** The lowest of the flashover criteria that apply to the room, kW; null when none does. */
export function lowestFlashover({ room }: RoomTally): { readonly name: string; readonly value: number } | null {
  let lowest: { readonly name: string; readonly value: number } | null = null;
  for (const way of ['thomas', 'babrauskas', 'mqh'] as const) {
    const criterion = room.flashover[way];
    if (criterion?.value == null || !criterion.applicable) continue;
    if (lowest === null || criterion.value < lowest.value)
      lowest = { name: FLASHOVER_NAMES[way], value: criterion.value };
  }
  return lowest;
}
