import type { PlayedEvent, PlayedFire } from './spread-play.ts';

/** So long after it was lit an entry counts as just lit, s. */
const JUST_S = 30;

export interface LitEntry {
  readonly id: string;
  /** Place in the order of ignitions, from 1. */
  readonly order: number;
  readonly stage: 'just lit' | 'burning';
}

/** What is to be seen at one moment of a fire. */
export interface SpreadMoment {
  /** In the order they were lit. */
  readonly lit: readonly LitEntry[];
  /** What happened last. */
  readonly latest: PlayedEvent | null;
  /** What happens next; several entries where they light at once. */
  readonly next: readonly PlayedEvent[];
  readonly flashedOver: boolean;
}

export function spreadMoment({ events, flashover_s }: PlayedFire, at_s: number): SpreadMoment {
  const past = events.filter((event) => event.t_s <= at_s);
  const lit = past.flatMap(({ id, t_s }, index): LitEntry[] =>
    id === null ? [] : [{ id, order: index + 1, stage: at_s - t_s < JUST_S ? 'just lit' : 'burning' }],
  );
  const coming = events[past.length];
  return {
    lit,
    latest: past.at(-1) ?? null,
    next: coming === undefined ? [] : events.slice(past.length).filter((event) => event.t_s === coming.t_s),
    flashedOver: flashover_s !== null && flashover_s <= at_s,
  };
}
