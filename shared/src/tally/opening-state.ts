import type { RoomInputOpening } from './room-input.ts';

const USUAL_STATE = { door: 'closed', window: 'fails', vent: 'open', shutter: 'closed', gap: 'open' } as const;

/** The state of an opening; what nobody said follows from its kind, and without a kind it is open. */
export function openingState({ state, kind }: Pick<RoomInputOpening, 'state' | 'kind'>): 'open' | 'fails' | 'closed' {
  return state ?? (kind == null ? 'open' : USUAL_STATE[kind]);
}
