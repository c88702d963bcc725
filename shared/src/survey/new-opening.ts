import type { Opening } from './survey-document.ts';

type Start = Pick<Opening, 'width_m' | 'height_m' | 'sill_m' | 'state'>;

/** How an opening of each kind starts: a door is closed, a window's glass fails at flashover, a vent stands open. */
export const OPENING_STARTS: Readonly<Record<Opening['kind'], Start>> = {
  door: { width_m: 0.9, height_m: 2, sill_m: 0, state: 'closed' },
  window: { width_m: 1.2, height_m: 1.2, sill_m: 0.9, state: 'fails' },
  vent: { width_m: 0.6, height_m: 0.3, sill_m: 2, state: 'open' },
  shutter: { width_m: 3, height_m: 2.5, sill_m: 0, state: 'closed' },
  gap: { width_m: 1, height_m: 2, sill_m: 0, state: 'open' },
};

/** An opening in a wall, with the size and state its kind starts with unless given. */
export function newOpening(
  given: Pick<Opening, 'id' | 'storey_id' | 'wall' | 'offset_m' | 'kind'> & Partial<Opening>,
): Opening {
  return { ...OPENING_STARTS[given.kind], label: '', ...given };
}
