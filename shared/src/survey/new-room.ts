import type { Room } from './survey-document.ts';
import { UNKNOWN_LINING, UNKNOWN_PROTECTION } from './unknown-protection.ts';

/** A room as it starts: the storey's height, nothing known of its use, lining or protection. */
export function newRoom(
  given: Pick<Room, 'id' | 'storey_id' | 'name' | 'ring'> & Partial<Omit<Room, 'id' | 'storey_id' | 'name' | 'ring'>>,
): Room {
  return {
    holes: [],
    height_m: null,
    use: null,
    lining: UNKNOWN_LINING,
    protection: UNKNOWN_PROTECTION,
    rating_min: null,
    danger_of_activation: null,
    measured_floor_area_m2: null,
    compartment_floor_m2: null,
    bounded_by_rated_construction: null,
    roof_vents_m2: 0,
    roof_vents_state: 'open',
    notes: '',
    assumptions: null,
    photos: [],
    to_do: '',
    ...given,
  };
}
