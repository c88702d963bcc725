import type { JobQueue } from './job-queues.ts';

/** Work done off the request thread. A job may run twice; its handler must not mind. */
export interface Jobs {
  /** @param id the job's own id: sending the same again adds nothing */
  readonly send: (queue: JobQueue, id: string, data: object) => Promise<void>;
  /** Starts taking jobs of a queue, one after the other. A thrown error puts the job back until its tries are used up. */
  readonly work: (
    queue: JobQueue,
    handle: (job: { readonly id: string; readonly data: unknown }) => Promise<void>,
  ) => Promise<void>;
  readonly open: () => Promise<void>;
  readonly close: () => Promise<void>;
}
