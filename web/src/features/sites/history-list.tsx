import type { Site } from '@embertally/shared/contracts/sites';
import { useInfiniteQuery } from '@tanstack/react-query';
import { Button } from '../../components/button.tsx';
import { LoadFailed } from '../../components/load-failed.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import { dateWords } from '../../lib/date-words.ts';
import { useUnits } from '../../lib/units-context.ts';
import { siteHistoryQuery } from './api/site-history.ts';
import { historySentence } from './history-sentence.ts';

interface HistoryListProps {
  readonly siteId: string;
  /** The site's own: its days and hours. */
  readonly timeZone: string;
  readonly people: Site['people'];
}

/** What was done on a site, newest first. */
export function HistoryList({ siteId, timeZone, people }: HistoryListProps) {
  const units = useUnits();
  const history = useInfiniteQuery(siteHistoryQuery(siteId));
  if (history.isPending) return <Skeleton label="Reading what was done here" lines={4} />;
  if (history.isError) {
    return (
      <div className="mt-4">
        <LoadFailed
          what="The history"
          error={history.error}
          retrying={history.isFetching}
          onRetry={() => void history.refetch()}
        />
      </div>
    );
  }
  const events = history.data.pages.flatMap((page) => page.items);
  if (events.length === 0) return <p className="py-3 text-soft">Nothing has been done here yet.</p>;
  const reader = {
    units,
    memberName: (id: string) => people.find((person) => person.member_id === id)?.name,
  };
  return (
    <>
      <ol>
        {events.map((event) => (
          <li key={event.position} className="border-b border-rule py-2.5">
            <p>{historySentence(event, reader)}</p>
            <p className="text-small text-soft">
              {event.by === null ? '' : `${event.by.organisation_name} · `}
              <time dateTime={event.at}>{dateWords(event.at, 'moment', timeZone)}</time>
            </p>
          </li>
        ))}
      </ol>
      {history.hasNextPage ? (
        <div className="pt-3">
          <Button size="small" busy={history.isFetchingNextPage} onClick={() => void history.fetchNextPage()}>
            Show earlier
          </Button>
        </div>
      ) : null}
    </>
  );
}
