import { use, useSyncExternalStore } from 'react';
import type { PlayState, SpreadPlay } from './spread-play.ts';
import { SpreadPlayContext } from './spread-play-context.ts';

/** The player of the open Book, to act on it. */
export function usePlayer(): SpreadPlay {
  return use(SpreadPlayContext);
}

/**
 * Reads one part of what is played and re-renders only when it changes.
 * @param selector Must return a part of the state or a primitive, not a fresh object.
 */
export function useSpreadPlay<T>(selector: (state: PlayState) => T): T {
  const play = use(SpreadPlayContext);
  return useSyncExternalStore(play.subscribe, () => selector(play.get()));
}
