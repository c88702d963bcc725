import { applyChangeSet, readChanges, type FedChangeSet } from '@embertally/shared/contracts/surveys';
import type { ChangeSetBody, Changes } from '@embertally/shared/survey/change';
import { stepUpChanges } from '@embertally/shared/survey/versions/step-up';
import { call } from '../../lib/api-client.ts';

/** One survey on the server, as saving sees it. */
export interface SurveyServer {
  send(set: ChangeSetBody): Promise<{ readonly sequence: number; readonly changes: Changes }>;
  changesAfter(sequence: number): Promise<{ readonly items: readonly FedChangeSet[]; readonly more: boolean }>;
}

export function surveyServer(surveyId: string): SurveyServer {
  return {
    send: (body) => call(applyChangeSet, { params: { surveyId }, body }),
    async changesAfter(after) {
      const answer = await call(readChanges, { params: { surveyId }, query: { after } });
      return { ...answer, items: answer.items.map((set) => ({ ...set, changes: stepUpChanges(set.changes) })) };
    },
  };
}
