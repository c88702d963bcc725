import type { SpreadTallyEvent } from '@embertally/shared/tally/room-tally';

/** What lit an entry, in words. */
export function causeWords({ cause, from }: SpreadTallyEvent, nameOf: (id: string) => string): string {
  switch (cause) {
    case 'first':
      return 'burns first';
    case 'radiation':
      return from == null ? 'radiation' : `radiation, most of it from ${nameOf(from)}`;
    case 'layer':
      return 'the hot layer under the ceiling';
    case 'flame':
      return from == null ? 'a flame that reaches it' : `the flame of ${nameOf(from)}`;
    case 'flashover':
      return 'flashover of the room';
    case 'starved':
      return 'the air of the room is used up';
  }
}
