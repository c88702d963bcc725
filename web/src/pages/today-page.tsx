import { canInOrganisation } from '@embertally/shared/policy/policy';
import { useInfiniteQuery, useQuery } from '@tanstack/react-query';
import { EmptyState } from '../components/empty-state.tsx';
import { LinkButton } from '../components/link-button.tsx';
import { LoadFailed } from '../components/load-failed.tsx';
import { Page } from '../components/page.tsx';
import { Part } from '../components/part.tsx';
import { Skeleton } from '../components/skeleton.tsx';
import { currentSessionQuery } from '../features/session/api/current-session.ts';
import { sitesQuery } from '../features/sites/api/sites.ts';
import { RecentBooks } from '../features/sites/recent-books.tsx';
import { WaitingList } from '../features/sites/waiting-list.tsx';
import { dateWords } from '../lib/date-words.ts';
import { paths } from '../lib/paths.ts';

export function TodayPage() {
  const sites = useInfiniteQuery(sitesQuery(''));
  const me = useQuery(currentSessionQuery()).data;
  const acting = me?.members.find((member) => member.id === me.member_id);
  const today = dateWords(new Date().toISOString(), 'weekday');
  const lead = acting === undefined ? today : `${today} · ${me?.person.name ?? ''}, ${acting.organisation_name}`;

  if (sites.isPending) {
    return (
      <Page title="Today" lead={lead} right={<Skeleton label="Reading recent books" />}>
        <Skeleton label="Reading what waits for you" />
      </Page>
    );
  }
  if (sites.isError) {
    return (
      <Page title="Today" lead={lead}>
        <LoadFailed
          what="Your sites"
          error={sites.error}
          retrying={sites.isFetching}
          onRetry={() => void sites.refetch()}
        />
      </Page>
    );
  }
  const all = sites.data.pages.flatMap((page) => page.items);
  if (all.length === 0) {
    const mayMake = canInOrganisation(acting?.role ?? null, 'site.create');
    return (
      <Page title="Today" lead={lead}>
        <EmptyState
          title="The book is still empty"
          action={
            mayMake ? (
              <LinkButton look="primary" to={paths.newSite()}>
                New site
              </LinkButton>
            ) : undefined
          }
        >
          Begin with a site: the place. Then its building, whose Book holds the plan, the contents and the tallies.
        </EmptyState>
      </Page>
    );
  }
  return (
    <Page
      title="Today"
      lead={lead}
      right={
        <Part title="Recent books">
          <RecentBooks sites={all} />
        </Part>
      }
    >
      <Part title="What waits for you">
        <WaitingList sites={all} />
      </Part>
    </Page>
  );
}
