import type { RoomInput } from '@embertally/shared/tally/room-input';

/** What an estimate is made from, as plain data that can be sent to another thread. */
export interface EstimateTask {
  readonly input: RoomInput;
  readonly workings: boolean;
}

/**
 * Makes the tally of one room, as JSON.
 * @param signal ends it at once
 * @throws EstimateStoppedError when nobody waits for it any more
 */
export type EstimateMaker = (task: EstimateTask, signal: AbortSignal) => Promise<string>;

/** Whoever asked has left; nothing is kept. */
export class EstimateStoppedError extends Error {
  override readonly name = 'EstimateStoppedError';

  constructor() {
    super('The estimate was stopped.');
  }
}
