import { describe, expect, it } from 'vitest';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { parseRoomInput } from '@embertally/shared/tally/parse-room-input';
import { inputWords } from '../../../../api/src/reports/pages/input-words.ts';

describe('the words for an input that is wanting', () => {
  it('never show a path of the contract to whoever reads the page', () => {
    const bare = parseRoomInput({
      room: {
        name: 'Bare',
        ring_m: [
          [0, 0],
          [4, 0],
          [4, 3],
          [0, 3],
        ],
        height_m: 3,
      },
      contents: [],
    });
    if (!bare.ok) throw new Error(JSON.stringify(bare.errors));
    const { missing } = estimateRoom(bare.value);
    expect(missing.length).toBeGreaterThan(5);
    for (const { input } of missing) expect(inputWords(input)).toMatch(/^(–|[a-z ]+)$/);
  });

  it('name the openings and the linings', () => {
    expect(inputWords('room.openings')).toBe('openings');
    expect(inputWords('room.lining.walls')).toBe('linings');
    expect(inputWords('engine')).toBe('–');
  });
});
