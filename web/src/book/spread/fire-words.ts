import type { PlayedEvent } from './spread-play.ts';

/** What lit an entry, in words: "radiation of Sofa". */
export function causeWords(
  { cause, from }: Pick<PlayedEvent, 'cause' | 'from'>,
  nameOf: (id: string) => string,
): string {
  switch (cause) {
    case 'first':
      return 'burns first';
    case 'radiation':
      return from === null ? 'radiation' : `radiation, most of it from ${nameOf(from)}`;
    case 'layer':
      return 'the hot layer under the ceiling';
    case 'flame':
      return from === null ? 'a flame that reaches it' : `the flame of ${nameOf(from)}`;
    case 'flashover':
      return 'flashover of the room';
    case 'starved':
      return 'the air of the room is used up';
  }
}

/** What happens, as a sentence without its end: "Sofa is lit by radiation, most of it from Chair". */
export function eventWords(event: PlayedEvent, nameOf: (id: string) => string): string {
  if (event.id === null || event.cause === 'starved') return 'The air of the room is used up';
  const name = nameOf(event.id);
  return event.cause === 'first' ? `${name} burns first` : `${name} is lit by ${causeWords(event, nameOf)}`;
}
