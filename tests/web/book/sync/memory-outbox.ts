import type { Step } from '@embertally/web/src/book/session/history.ts';
import type { KeptSet } from '@embertally/web/src/book/sync/kept-set.ts';
import type { Outbox } from '@embertally/web/src/book/sync/outbox.ts';

/** The device's disk in a test: keeps what it is given across sessions, and can refuse to. */
export class MemoryOutbox implements Outbox {
  readonly kept = new Map<string, KeptSet>();
  steps: readonly Step[] = [];
  full = false;

  load(): Promise<readonly KeptSet[]> {
    return Promise.resolve([...this.kept.values()].sort((a, b) => a.order - b.order));
  }

  put(_surveyId: string, set: KeptSet): Promise<void> {
    if (this.full) return Promise.reject(new Error('quota exceeded'));
    // As a disk would: a copy, not the object itself.
    this.kept.set(set.body.id, structuredClone(set));
    return Promise.resolve();
  }

  remove(_surveyId: string, id: string): Promise<void> {
    this.kept.delete(id);
    return Promise.resolve();
  }

  loadSteps(): Promise<readonly Step[]> {
    return Promise.resolve(this.steps);
  }

  putSteps(_surveyId: string, steps: readonly Step[]): Promise<void> {
    this.steps = structuredClone(steps);
    return Promise.resolve();
  }
}
