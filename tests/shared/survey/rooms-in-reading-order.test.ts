import { describe, expect, it } from 'vitest';
import { roomsInReadingOrder } from '@embertally/shared/survey/derive/rooms-in-reading-order';
import { box, groundFloor, GROUND, withRoom } from '../../support/survey-builder.ts';

/**
 *   ┌────────┬─────┐
 *   │ Dock   │ Shop│
 *   ├────┬───┴─────┤
 *   │ Bay│ Corridor│
 *   └────┴─────────┘
 */
describe('rooms in reading order', () => {
  it('go row by row from the top, left to right, in whatever order they were drawn', () => {
    let document = groundFloor();
    document = withRoom(document, 'Corridor', box(4, 0, 8, 3));
    document = withRoom(document, 'Shop', box(7, 3, 5, 4));
    document = withRoom(document, 'Bay', box(0, 0, 4, 3));
    document = withRoom(document, 'Dock', box(0, 3, 7, 4));
    expect(roomsInReadingOrder(document, GROUND).map(({ name }) => name)).toEqual(['Dock', 'Shop', 'Bay', 'Corridor']);
  });
});
