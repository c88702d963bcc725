import { listRoomSummaries } from '@embertally/shared/contracts/surveys';
import { queryOptions } from '@tanstack/react-query';
import { call } from './api-client.ts';

/** The headline of every room of one survey, as last computed. */
export function roomSummariesQuery(surveyId: string) {
  return queryOptions({
    queryKey: ['survey', surveyId, 'room-summaries'],
    queryFn: ({ signal }) => call(listRoomSummaries, { params: { surveyId }, signal }),
  });
}
