import { listLimits } from '@embertally/shared/contracts/limits';
import type { Me } from '@embertally/shared/contracts/sessions';
import { readDocument, readSurvey } from '@embertally/shared/contracts/surveys';
import { canOnSite } from '@embertally/shared/policy/policy';
import { fromStored } from '@embertally/shared/survey/stored';
import { call } from '../lib/api-client.ts';
import { BookSession } from './session/book-session.ts';
import { indexedDbOutbox } from './sync/indexed-db-outbox.ts';
import { surveyServer } from './sync/survey-server.ts';
import { SurveySync } from './sync/survey-sync.ts';

export interface OpenBook {
  readonly session: BookSession;
  readonly sync: SurveySync;
}

/** Reads a survey and opens it for one person: session, saving and what waited on the device. */
export async function openBook(surveyId: string, me: Me, signal: AbortSignal): Promise<OpenBook> {
  const params = { surveyId };
  const [survey, stored] = await Promise.all([
    call(readSurvey, { params, signal }),
    call(readDocument, { params, signal }),
  ]);
  const limits = await call(listLimits, { params: { buildingId: survey.building.id }, signal });
  const document = fromStored(stored);
  const newId = () => crypto.randomUUID();
  const now = () => new Date().toISOString();
  const session: BookSession = new BookSession(
    {
      survey,
      document,
      limits: limits.items,
      units: me.person.units,
      canEdit: canOnSite({ role: survey.my_role, ofKeeper: survey.of_keeper }, 'survey.edit'),
      person: me.person.name,
    },
    {
      newId,
      now,
      queue: (set) => {
        sync.enqueue(set);
      },
      keepSteps: (steps) => {
        sync.keepSteps(steps);
      },
    },
  );
  const sync = new SurveySync(session, document, {
    outbox: indexedDbOutbox(me.person.id),
    server: surveyServer(surveyId),
    newId,
    now,
    jitter: () => (crypto.getRandomValues(new Uint32Array(1))[0] ?? 0) / 2 ** 32,
  });
  await sync.start();
  return { session, sync };
}
