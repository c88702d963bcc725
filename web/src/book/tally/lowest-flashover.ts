import type { RoomTally } from '@embertally/shared/tally/room-tally';

export const FLASHOVER_WAYS = ['thomas', 'babrauskas', 'mqh'] as const;
export type FlashoverWay = (typeof FLASHOVER_WAYS)[number];

export const FLASHOVER_NAMES: Readonly<Record<FlashoverWay, string>> = {
  thomas: 'Thomas',
  babrauskas: 'Babrauskas',
  mqh: 'McCaffrey, Quintiere, Harkleroad',
};

/** The lowest of the flashover criteria that apply to this room; null when none does. */
export function lowestFlashover(
  flashover: RoomTally['room']['flashover'],
): { readonly way: FlashoverWay; readonly value_kW: number } | null {
  const applicable = FLASHOVER_WAYS.flatMap((way) => {
    const criterion = flashover[way];
    return criterion?.applicable === true && criterion.value !== null ? [{ way, value_kW: criterion.value }] : [];
  });
  return applicable.sort((a, b) => a.value_kW - b.value_kW)[0] ?? null;
}
