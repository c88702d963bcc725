import { availableParallelism } from 'node:os';
import { Worker } from 'node:worker_threads';
import { Fault } from '../fault.ts';
import { EstimateStoppedError, type EstimateTask } from '../services/estimate-maker.ts';
import type { EstimateMessage } from './estimate-message.ts';

export interface EstimateThreadsOptions {
  /** Threads at most; one processor is left to answer requests. */
  readonly threads?: number;
  /** Tasks that may wait while every thread works. */
  readonly waiting?: number;
  /** Longest a task may take, ms. */
  readonly longest_ms?: number;
}

/** Old-generation heap of a thread, MB: a task that needs more fails alone and leaves the process standing. */
const HEAP_MB = 512;
const MOST_THREADS = 4;
const WAITING = 16;
const LONGEST_ms = 60_000;
const RETRY_AFTER_s = 5;

interface Job {
  readonly task: EstimateTask;
  readonly resolve: (json: string) => void;
  readonly reject: (error: Error) => void;
}

/**
 * Threads for estimates that take longer than a request should hold the process: started when first needed, kept for the
 * next task, ended with a task that is stopped. What does not fit into the queue is refused at once.
 */
export class EstimateThreads {
  private readonly threads: number;
  private readonly waiting: number;
  private readonly longest_ms: number;
  private readonly queue: Job[] = [];
  private readonly idle: Worker[] = [];
  private readonly working = new Map<Job, { readonly worker: Worker; readonly release: () => void }>();
  private closed = false;

  constructor(options: EstimateThreadsOptions = {}) {
    this.threads = options.threads ?? Math.min(MOST_THREADS, Math.max(1, availableParallelism() - 1));
    this.waiting = options.waiting ?? WAITING;
    this.longest_ms = options.longest_ms ?? LONGEST_ms;
  }

  /**
   * The tally of one room as JSON, made in a thread.
   * @throws Fault 503 when too many wait, 422 when it takes too long; EstimateStoppedError when it was stopped
   */
  make(task: EstimateTask, signal: AbortSignal): Promise<string> {
    if (signal.aborted || this.closed) return Promise.reject(new EstimateStoppedError());
    if (this.working.size >= this.threads && this.queue.length >= this.waiting) return Promise.reject(tooMany());
    return new Promise((resolve, reject) => {
      const stop = () => this.drop(job, new EstimateStoppedError());
      const settled = () => signal.removeEventListener('abort', stop);
      const job: Job = {
        task,
        resolve: (json) => {
          settled();
          resolve(json);
        },
        reject: (error) => {
          settled();
          reject(error);
        },
      };
      signal.addEventListener('abort', stop, { once: true });
      this.queue.push(job);
      this.next();
    });
  }

  /** Stops what is running or waiting and ends every thread. */
  async close(): Promise<void> {
    this.closed = true;
    for (const job of [...this.queue, ...this.working.keys()]) this.drop(job, new EstimateStoppedError());
    await Promise.all(this.idle.splice(0).map((worker) => worker.terminate()));
  }

  private next(): void {
    if (this.closed || this.working.size >= this.threads) return;
    const job = this.queue.shift();
    if (job === undefined) return;
    const worker = this.idle.pop() ?? this.startThread();
    const late = setTimeout(() => this.drop(job, tooLong(this.longest_ms)), this.longest_ms);
    const answered = (message: EstimateMessage) => {
      release();
      worker.unref();
      this.idle.push(worker);
      if (message.kind === 'done') job.resolve(message.json);
      else job.reject(new Error(`An estimate failed in its thread: ${message.message}`));
      this.next();
    };
    const broken = (reason: unknown) => {
      release();
      job.reject(reason instanceof Error ? reason : new Error('The thread of an estimate ended before it was whole.'));
      this.next();
    };
    const release = () => {
      clearTimeout(late);
      this.working.delete(job);
      worker.off('message', answered).off('error', broken).off('exit', broken);
    };
    worker.on('message', answered).on('error', broken).on('exit', broken);
    // A thread that works keeps the process; an idle one does not.
    worker.ref();
    this.working.set(job, { worker, release });
    worker.postMessage(job.task);
  }

  private startThread(): Worker {
    const worker = new Worker(new URL('./estimate-worker.mjs', import.meta.url), {
      resourceLimits: { maxOldGenerationSizeMb: HEAP_MB },
    });
    const forget = () => {
      const at = this.idle.indexOf(worker);
      if (at >= 0) this.idle.splice(at, 1);
    };
    // A thread that dies while nobody waits for it must not take the process with it.
    worker.on('error', forget).on('exit', forget);
    return worker;
  }

  /** Takes a job out of the queue, or ends the thread that works on it. */
  private drop(job: Job, reason: Error): void {
    const waits = this.queue.indexOf(job);
    if (waits >= 0) this.queue.splice(waits, 1);
    const found = this.working.get(job);
    if (found !== undefined) {
      found.release();
      void found.worker.terminate();
    }
    job.reject(reason);
    this.next();
  }
}

function tooMany(): Fault {
  return new Fault(
    'unavailable',
    'estimates-busy',
    'Too many estimates are being computed at this moment. Nothing was computed; try again in a few seconds.',
    { retryAfter_s: RETRY_AFTER_s },
  );
}

function tooLong(longest_ms: number): Fault {
  const message = `It takes longer than ${Math.round(longest_ms / 1000)} s. Ask for fewer samples, or name the entry that burns first.`;
  return Fault.invalid([{ pointer: '/options', code: 'takes_too_long', message }], `Nothing was computed. ${message}`);
}
