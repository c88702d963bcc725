import type { FedChangeSet } from '@embertally/shared/contracts/surveys';
import { applyChanges } from '@embertally/shared/survey/apply-changes';
import type { ChangeSetBody, Changes } from '@embertally/shared/survey/change';
import { sameValue } from '@embertally/shared/survey/same-value';
import type { SurveyDocument } from '@embertally/shared/survey/survey-document';
import { rowsOf } from '@embertally/shared/survey/rows';
import type { BookSession } from '../session/book-session.ts';
import type { Step } from '../session/history.ts';
import { backOff_s } from './back-off.ts';
import { dependsOn } from './depends-on.ts';
import { keepMine } from './keep-mine.ts';
import type { KeptSet } from './kept-set.ts';
import type { Outbox } from './outbox.ts';
import { rebase } from './rebase.ts';
import { savingStatusOf } from './saving-status-of.ts';
import { sendFailure } from './send-failure.ts';
import type { SurveyServer } from './survey-server.ts';

export interface SurveySyncPorts {
  readonly outbox: Outbox;
  readonly server: SurveyServer;
  readonly newId: () => string;
  /** ISO instant. */
  readonly now: () => string;
  /** 0 to 1. */
  readonly jitter: () => number;
}

/**
 * Carries one person's changes to the server and other people's here. Sets go in order, one at a time; each stays on the
 * device until the server has taken it. Resending is harmless: the server knows a set by its id.
 */
export class SurveySync {
  readonly #session: BookSession;
  readonly #ports: SurveySyncPorts;
  /** The document as the server has it, up to its sequence number. */
  #base: SurveyDocument;
  #unsent: readonly KeptSet[] = [];
  #why: 'offline' | 'signed-out' | 'server' | null = null;
  #savedAt: string | null = null;
  /** Unsent sets the device would not store: only in memory. */
  readonly #inMemoryOnly = new Set<string>();
  #readable = true;
  #order = 0;
  #steps: readonly Step[] | null = null;
  #sending = false;
  #stopped = false;
  #wake: (() => void) | null = null;
  #disk: Promise<void> = Promise.resolve();
  #catchingUp: Promise<void> | null = null;

  constructor(session: BookSession, base: SurveyDocument, ports: SurveySyncPorts) {
    this.#session = session;
    this.#base = base;
    this.#ports = ports;
  }

  /** Brings back what waited on the device since the last visit, shows it and goes on sending. */
  async start(): Promise<void> {
    try {
      this.#session.restoreSteps(await this.#ports.outbox.loadSteps(this.#base.surveyId));
      const kept = await this.#ports.outbox.load(this.#base.surveyId);
      this.#unsent = [...kept, ...this.#unsent];
      this.#order = Math.max(this.#order, ...this.#unsent.map((set) => set.order));
      if (kept.length > 0) this.#show();
    } catch {
      // Nothing can be read from the device; the status says that changes are kept in memory only.
      this.#readable = false;
    }
    this.#publish();
    void this.#send();
  }

  stop(): void {
    this.#stopped = true;
    this.#wake?.();
  }

  /** Takes one gesture's changes to keep and send. */
  enqueue(body: ChangeSetBody): void {
    this.#order += 1;
    const set: KeptSet = { body, order: this.#order, rows: this.#editedRows(body.changes), held: null };
    this.#unsent = [...this.#unsent, set];
    this.#keep(set);
    this.#publish();
    void this.#send();
  }

  /** Keeps the way back on the device; of several in a row only the latest is written. */
  keepSteps(steps: readonly Step[]): void {
    const waiting = this.#steps !== null;
    this.#steps = steps;
    if (waiting) return;
    this.#write(async () => {
      const latest = this.#steps ?? [];
      this.#steps = null;
      await this.#ports.outbox.putSteps(this.#base.surveyId, latest);
    });
  }

  /** The network is back, the tab is looked at again, or the person asks: do not wait for the next turn. */
  retryNow(): void {
    this.#wake?.();
    void this.#send();
  }

  /** Fetches what others have changed. Failing is not told: the next event or turn tries again. */
  catchUp(): Promise<void> {
    this.#catchingUp ??= this.#fetchChanges().finally(() => {
      this.#catchingUp = null;
    });
    return this.#catchingUp;
  }

  /** Solves a clash for this person's values. */
  async keepMine(id: string): Promise<void> {
    const held = this.#unsent.find((set) => set.body.id === id);
    if (held === undefined) return;
    await this.catchUp();
    const body = keepMine(held, this.#base, this.#ports.newId);
    if (body === null) {
      this.#drop(id);
      this.#session.say({ kind: 'notice', text: 'What you changed is gone, so nothing of it could be kept.' });
    } else {
      const again: KeptSet = { ...held, body, held: null };
      this.#unsent = this.#unsent.map((set) => (set === held ? again : set));
      this.#keep(again);
      this.#forget(id);
    }
    this.#show();
    this.#publish();
    void this.#send();
  }

  /** Solves a clash for the other side's values, or lets go of a set the server refused. */
  async takeTheirs(id: string): Promise<void> {
    if (!this.#unsent.some((set) => set.body.id === id)) return;
    await this.catchUp();
    this.#drop(id);
    this.#show();
    this.#session.forgetHistory();
    this.#session.say({ kind: 'notice', text: 'Theirs is taken. Undo starts anew from here.' });
    this.#publish();
    void this.#send();
  }

  /** Everything unsent, to be saved as a file when the server will not have it. */
  unsent(): readonly KeptSet[] {
    return this.#unsent;
  }

  /** Resolves when what was to be written on the device is written. */
  settled(): Promise<void> {
    return this.#disk;
  }

  async #send(): Promise<void> {
    if (this.#sending || this.#stopped) return;
    this.#sending = true;
    let attempt = 0;
    for (let set = this.#next(); set !== undefined && !this.#isStopped(); set = this.#next()) {
      try {
        const answer = await this.#ports.server.send(set.body);
        attempt = 0;
        this.#why = null;
        await this.#accepted(set, answer.sequence, answer.changes);
      } catch (error) {
        const failure = sendFailure(error);
        if (failure.kind === 'hold') this.#hold(set, failure);
        else {
          this.#why = failure.why;
          this.#publish();
          await this.#wait(failure.after_s ?? backOff_s(attempt, this.#ports.jitter()));
          attempt += 1;
        }
      }
    }
    this.#sending = false;
    this.#publish();
  }

  /** The first set that is neither held nor built on one that is. */
  #next(): KeptSet | undefined {
    const held: Changes[] = [];
    for (const set of this.#unsent) {
      if (set.held === null && !held.some((changes) => dependsOn(set.body.changes, changes))) return set;
      held.push(set.body.changes);
    }
    return undefined;
  }

  async #accepted(set: KeptSet, sequence: number, changes: Changes): Promise<void> {
    this.#drop(set.body.id);
    this.#savedAt = this.#ports.now();
    if (sequence === this.#base.sequence + 1) {
      this.#base = { ...applyChanges(this.#base, changes), sequence };
      if (!sameValue(changes, set.body.changes)) this.#show();
    } else if (sequence > this.#base.sequence) await this.catchUp();
    this.#publish();
  }

  #hold(set: KeptSet, held: NonNullable<KeptSet['held']>): void {
    const kept = { ...set, held: { reason: held.reason, clashes: held.clashes } };
    this.#unsent = this.#unsent.map((other) => (other === set ? kept : other));
    this.#why = null;
    this.#keep(kept);
    this.#publish();
    void this.catchUp();
  }

  async #fetchChanges(): Promise<void> {
    try {
      let more = true;
      while (more && !this.#stopped) {
        const answer = await this.#ports.server.changesAfter(this.#base.sequence);
        more = answer.more && answer.items.length > 0;
        this.#take(answer.items);
      }
    } catch (error) {
      const failure = sendFailure(error);
      this.#why = failure.kind === 'retry' ? failure.why : 'server';
      this.#publish();
    }
  }

  #take(items: readonly FedChangeSet[]): void {
    let moved = false;
    for (const item of items) {
      if (item.sequence <= this.#base.sequence) continue;
      this.#base = { ...applyChanges(this.#base, item.changes), sequence: item.sequence };
      // An answer that was lost on the way: the server has the set all the same.
      this.#drop(item.id);
      moved = true;
    }
    if (!moved) return;
    this.#show();
    this.#publish();
  }

  #show(): void {
    this.#session.receive(
      rebase(
        this.#base,
        this.#unsent.map((set) => set.body.changes),
      ),
    );
  }

  #drop(id: string): void {
    if (!this.#unsent.some((set) => set.body.id === id)) return;
    this.#unsent = this.#unsent.filter((set) => set.body.id !== id);
    this.#forget(id);
  }

  #keep(set: KeptSet): void {
    const { id } = set.body;
    this.#write(async () => {
      this.#inMemoryOnly.add(id);
      await this.#ports.outbox.put(this.#base.surveyId, set);
      this.#inMemoryOnly.delete(id);
    });
  }

  #forget(id: string): void {
    this.#write(async () => {
      this.#inMemoryOnly.delete(id);
      await this.#ports.outbox.remove(this.#base.surveyId, id);
    });
  }

  /** Writes go to the device one after the other, so that a removal never overtakes its own set. */
  #write(act: () => Promise<void>): void {
    const done = () => {
      this.#publish();
    };
    // A write that fails shows in the status: its set stays among those that are in memory only.
    this.#disk = this.#disk.then(act).then(done, done);
  }

  #editedRows(changes: Changes): KeptSet['rows'] {
    const rows: Record<string, Readonly<Record<string, unknown>>> = {};
    for (const change of changes) {
      if (change.kind !== 'entry' || change.before === null || change.after === null) continue;
      const row = rowsOf(this.#session.state.document, 'entry').get(change.id);
      if (row !== undefined) rows[change.id] = { ...row };
    }
    return rows;
  }

  #publish(): void {
    if (this.#stopped) return;
    this.#session.setSaving(
      savingStatusOf(this.#unsent, this.#why, this.#savedAt, this.#readable && this.#inMemoryOnly.size === 0),
    );
  }

  #isStopped(): boolean {
    return this.#stopped;
  }

  #wait(seconds: number): Promise<void> {
    return new Promise((resolve) => {
      const done = () => {
        clearTimeout(timer);
        this.#wake = null;
        resolve();
      };
      const timer = setTimeout(done, seconds * 1000);
      this.#wake = done;
    });
  }
}
