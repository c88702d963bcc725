import {
  applyChangeSet,
  listRoomSummaries,
  readChanges,
  readDocument,
  readEvents,
  readSurvey,
} from '@embertally/shared/contracts/surveys';
import { defineRoute, type Route } from '../http/define-route.ts';
import { alreadyHas, sequenceTag } from '../http/etags.ts';
import type { SurveyEvents } from '../http/survey-events.ts';
import type { ChangeSetService } from '../services/change-set-service.ts';
import type { SummaryService } from '../services/summary-service.ts';
import type { SurveyService } from '../services/survey-service.ts';

/** Kept by the browser, asked again every time. */
const REVALIDATE = { 'Cache-Control': 'private, no-cache', Vary: 'Cookie' };
const SEQUENCE = /"sequence" : (\d+)/;

interface SurveyParts {
  readonly surveys: SurveyService;
  readonly changeSets: ChangeSetService;
  readonly summaries: SummaryService;
  readonly events: SurveyEvents;
}

export function surveyRoutes({ surveys, changeSets, summaries, events }: SurveyParts): Route[] {
  return [
    defineRoute(readSurvey, async ({ access, params }) => ({
      kind: 'json',
      body: await surveys.read(access, params.surveyId),
    })),
    defineRoute(readDocument, async ({ access, params, request }) => {
      const known = sequenceTag(access.sequence ?? 0);
      if (alreadyHas(request, known)) return { kind: 'not-modified', etag: known, headers: REVALIDATE };
      const text = await surveys.documentText(params.surveyId);
      // The tag is of the state that was read, which may be newer than the one found on the way here.
      const sequence = Number(SEQUENCE.exec(text)?.[1]);
      return { kind: 'text', text, etag: sequenceTag(sequence), headers: REVALIDATE };
    }),
    defineRoute(readChanges, async ({ params, query }) => ({
      kind: 'json',
      body: await surveys.changesAfter(params.surveyId, query.after, query.limit),
    })),
    defineRoute(applyChangeSet, async ({ actor, params, body }) => {
      const accepted = await changeSets.apply(actor, params.surveyId, body);
      return { kind: 'json', body: { ...accepted, changes: [...accepted.changes] } };
    }),
    defineRoute(readEvents, ({ access, params, request, signedIn }) =>
      Promise.resolve(events.stream({ surveyId: params.surveyId, from: access.sequence ?? 0, request, signedIn })),
    ),
    defineRoute(listRoomSummaries, async ({ params }) => ({
      kind: 'json',
      body: { items: await summaries.list(params.surveyId) },
    })),
  ];
}
