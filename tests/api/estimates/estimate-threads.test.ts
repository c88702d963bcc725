import { afterEach, describe, expect, it } from 'vitest';
import type { RoomInput } from '@embertally/shared/tally/room-input';
import { EstimateThreads, type EstimateThreadsOptions } from '../../../api/src/estimates/estimate-threads.ts';
import { makeEstimate } from '../../../api/src/estimates/make-estimate.ts';
import { EstimateStoppedError } from '../../../api/src/services/estimate-maker.ts';
import { SCENERY_DOCK } from '../../shared/tally/scenery-dock.ts';

let open: EstimateThreads | null = null;
afterEach(() => open?.close());
function threads(options: EstimateThreadsOptions = {}): EstimateThreads {
  open = new EstimateThreads(options);
  return open;
}
const quick = { ...SCENERY_DOCK, options: { ...SCENERY_DOCK.options, samples: 500, seed: 3 } };
/** Takes minutes, so that it is certainly running when it is stopped. */
const long: RoomInput = {
  ...SCENERY_DOCK,
  contents: Array.from({ length: 5000 }, (_, i) => ({
    ...SCENERY_DOCK.contents[0]!,
    id: `e${i}`,
    x_m: null,
    y_m: null,
  })),
  options: { ...SCENERY_DOCK.options, samples: 100_000 },
};
const forGood = new AbortController().signal;
const task = (input: RoomInput, workings = false) => ({ input, workings });

describe('estimates in threads', () => {
  it('are what they are without one, to the last digit', async () => {
    const pool = threads({ threads: 1 });
    for (const workings of [false, true]) {
      expect(await pool.make(task(quick, workings), forGood)).toBe(makeEstimate(task(quick, workings)));
    }
  });

  it('stop on the way, and the next one is made', async () => {
    const pool = threads({ threads: 1 });
    const left = new AbortController();
    const stopped = pool.make(task(long), left.signal);
    const next = pool.make(task(quick), forGood);
    left.abort();
    await expect(stopped).rejects.toThrow(EstimateStoppedError);
    expect(await next).toBe(makeEstimate(task(quick)));
  });

  it('leave the queue when nobody waits for them, and never start when nobody did', async () => {
    const pool = threads({ threads: 1, waiting: 1 });
    const [first, second] = [new AbortController(), new AbortController()];
    const running = pool.make(task(long), first.signal);
    const waiting = pool.make(task(long), second.signal);
    second.abort();
    await expect(waiting).rejects.toThrow(EstimateStoppedError);
    const inItsPlace = pool.make(task(quick), forGood);
    first.abort();
    await expect(running).rejects.toThrow(EstimateStoppedError);
    await expect(inItsPlace).resolves.toContain('"engine"');
    await expect(pool.make(task(quick), AbortSignal.abort())).rejects.toThrow(EstimateStoppedError);
  });

  it('are refused when too many wait, with when to come back', async () => {
    const pool = threads({ threads: 1, waiting: 1 });
    const left = new AbortController();
    const busy = [pool.make(task(long), left.signal), pool.make(task(long), left.signal)];
    await expect(pool.make(task(quick), forGood)).rejects.toMatchObject({
      kind: 'unavailable',
      code: 'estimates-busy',
      retryAfter_s: 5,
    });
    left.abort();
    for (const one of busy) await expect(one).rejects.toThrow(EstimateStoppedError);
  });

  it('that take too long are ended and say what to ask for instead', async () => {
    const pool = threads({ threads: 1, longest_ms: 50 });
    await expect(pool.make(task(long), forGood)).rejects.toMatchObject({
      kind: 'invalid',
      errors: [{ pointer: '/options', code: 'takes_too_long' }],
    });
  });

  it('that fail tell it and leave the thread to the next one', async () => {
    const pool = threads({ threads: 1 });
    const broken = { ...SCENERY_DOCK, room: null } as unknown as RoomInput;
    await expect(pool.make(task(broken), forGood)).rejects.toThrow('An estimate failed in its thread');
    await expect(pool.make(task(quick), forGood)).resolves.toContain('"engine"');
  });

  it('end with the process that asked', async () => {
    const pool = threads({ threads: 1 });
    const running = pool.make(task(long), forGood);
    const ended = expect(running).rejects.toThrow(EstimateStoppedError);
    await pool.close();
    await ended;
    await expect(pool.make(task(quick), forGood)).rejects.toThrow(EstimateStoppedError);
  });
});
