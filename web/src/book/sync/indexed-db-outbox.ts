import { stepUpChanges } from '@embertally/shared/survey/versions/step-up';
import { openDB, type DBSchema, type IDBPDatabase } from 'idb';
import type { Step } from '../session/history.ts';
import type { KeptSet } from './kept-set.ts';
import type { Outbox } from './outbox.ts';

interface BookDatabase extends DBSchema {
  steps: { key: string; value: readonly Step[] };
  'change-sets': { key: [string, string]; value: KeptSet & { readonly surveyId: string; readonly id: string } };
}

const VERSION = 1;

/** The outbox on the device's disk, in a database of this person's own: nobody else on the tablet sees or sends it. */
export function indexedDbOutbox(personId: string): Outbox {
  let opened: Promise<IDBPDatabase<BookDatabase>> | null = null;
  const database = () => {
    opened ??= openDB<BookDatabase>(`embertally-${personId}`, VERSION, {
      upgrade(made) {
        made.createObjectStore('change-sets', { keyPath: ['surveyId', 'id'] });
        made.createObjectStore('steps');
      },
    });
    // A failed opening is tried again the next time something is to be kept.
    opened.catch(() => {
      opened = null;
    });
    return opened;
  };
  return {
    async load(surveyId) {
      const range = IDBKeyRange.bound([surveyId, ''], [surveyId, '\uffff']);
      const rows = await (await database()).getAll('change-sets', range);
      return rows
        .sort((a, b) => a.order - b.order)
        .map((row) => ({ ...row, body: { ...row.body, changes: stepUpChanges(row.body.changes) } }));
    },
    async put(surveyId, set) {
      await (await database()).put('change-sets', { ...set, surveyId, id: set.body.id });
    },
    async remove(surveyId, id) {
      await (await database()).delete('change-sets', [surveyId, id]);
    },
    async loadSteps(surveyId) {
      const steps = (await (await database()).get('steps', surveyId)) ?? [];
      return steps.map((step) => ({ ...step, changes: stepUpChanges(step.changes) }));
    },
    async putSteps(surveyId, steps) {
      await (await database()).put('steps', steps, surveyId);
    },
  };
}
