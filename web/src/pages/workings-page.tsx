import { listLimits } from '@embertally/shared/contracts/limits';
import { readDocument, readSurvey } from '@embertally/shared/contracts/surveys';
import { fromStored } from '@embertally/shared/survey/stored';
import { queryOptions, useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { roomLine } from '../book/tally/room-line.ts';
import { RoomWorkings } from '../book/tally/room-workings.tsx';
import { Button } from '../components/button.tsx';
import { EmptyState } from '../components/empty-state.tsx';
import { LinkButton } from '../components/link-button.tsx';
import { LoadFailed } from '../components/load-failed.tsx';
import { Page } from '../components/page.tsx';
import { Skeleton } from '../components/skeleton.tsx';
import { call } from '../lib/api-client.ts';
import { NotFoundError } from '../lib/api-errors.ts';
import { paths } from '../lib/paths.ts';
import { useUnits } from '../lib/units-context.ts';

function workingsQuery(surveyId: string) {
  return queryOptions({
    queryKey: ['workings', surveyId],
    queryFn: async ({ signal }) => {
      const params = { surveyId };
      const [survey, stored] = await Promise.all([
        call(readSurvey, { params, signal }),
        call(readDocument, { params, signal }),
      ]);
      const limits = await call(listLimits, { params: { buildingId: survey.building.id }, signal });
      return { survey, document: fromStored(stored), limits: limits.items };
    },
  });
}

/** Every working of one room, to read through or to print. */
export function WorkingsPage() {
  const { surveyId = '', roomId = '' } = useParams();
  const units = useUnits();
  const read = useQuery(workingsQuery(surveyId));
  const back = (
    <LinkButton to={paths.survey(surveyId)} look="primary">
      Back to the Book
    </LinkButton>
  );

  if (read.isPending) {
    return (
      <Page title="Workings">
        <Skeleton label="Reading the workings" lines={8} />
      </Page>
    );
  }
  if (read.isError) {
    if (read.error instanceof NotFoundError) {
      return (
        <Page title="There is no such survey">
          <EmptyState title="Nothing to show" action={<LinkButton to={paths.sites()}>Go to your sites</LinkButton>}>
            The address may be mistyped, or you have no role on this site. Its manager can give you one.
          </EmptyState>
        </Page>
      );
    }
    return (
      <Page title="Workings">
        <LoadFailed
          what="The workings"
          error={read.error}
          retrying={read.isFetching}
          onRetry={() => void read.refetch()}
        />
      </Page>
    );
  }
  const { survey, document, limits } = read.data;
  const room = document.rooms.get(roomId);
  const trail = [
    { label: survey.site.name, to: paths.site(survey.site.id) },
    { label: survey.building.name, to: paths.survey(surveyId) },
  ];
  if (room === undefined) {
    return (
      <Page title="There is no such room" trail={trail}>
        <EmptyState title="Nothing to show" action={back}>
          The room may have been deleted, or what drew it is still on its way from another device.
        </EmptyState>
      </Page>
    );
  }
  return (
    <Page
      title={`Workings: ${room.name}`}
      trail={trail}
      lead={
        <>
          <p>{roomLine(document, room, units)}</p>
          <p>
            {survey.site.name}, {survey.building.name}. Working survey, not issued; as stored after change{' '}
            {document.sequence}.
          </p>
        </>
      }
      actions={
        <>
          <LinkButton to={paths.survey(surveyId)} className="not-on-paper">
            Back to the Book
          </LinkButton>
          <Button
            look="primary"
            className="not-on-paper"
            onClick={() => {
              window.print();
            }}
          >
            Print
          </Button>
        </>
      }
    >
      <RoomWorkings document={document} roomId={room.id} limits={limits} />
    </Page>
  );
}
