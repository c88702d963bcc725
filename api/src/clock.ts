/** The one place time comes from, so that a test can move it. */
export interface Clock {
  readonly now: () => Date;
}

export const systemClock: Clock = { now: () => new Date() };
