import { canInOrganisation } from '@embertally/shared/policy/policy';
import { useInfiniteQuery, useQuery } from '@tanstack/react-query';
import { useDeferredValue } from 'react';
import { useSearchParams } from 'react-router-dom';
import { Button } from '../components/button.tsx';
import { EmptyState } from '../components/empty-state.tsx';
import { LinkButton } from '../components/link-button.tsx';
import { LoadFailed } from '../components/load-failed.tsx';
import { Page } from '../components/page.tsx';
import { Skeleton } from '../components/skeleton.tsx';
import { TextField } from '../components/text-field.tsx';
import { currentSessionQuery } from '../features/session/api/current-session.ts';
import { sitesQuery } from '../features/sites/api/sites.ts';
import { SitesTable } from '../features/sites/sites-table.tsx';
import { paths } from '../lib/paths.ts';
import { readSort, writeSort } from '../lib/sort-in-url.ts';

export function SitesPage() {
  const [url, setUrl] = useSearchParams();
  const search = url.get('find') ?? '';
  const asked = useDeferredValue(search.trim());
  const sites = useInfiniteQuery(sitesQuery(asked));
  const me = useQuery(currentSessionQuery()).data;
  const acting = me?.members.find((member) => member.id === me.member_id);
  const mayMake = canInOrganisation(acting?.role ?? null, 'site.create');
  const all = sites.data?.pages.flatMap((page) => page.items) ?? [];
  const make = mayMake ? (
    <LinkButton look="primary" to={paths.newSite()}>
      New site
    </LinkButton>
  ) : undefined;
  const write = (change: (next: URLSearchParams) => void) => {
    setUrl(
      (current) => {
        const next = new URLSearchParams(current);
        change(next);
        return next;
      },
      { replace: true },
    );
  };

  return (
    <Page title="Sites" lead="The places whose books you may read." actions={all.length > 0 ? make : undefined}>
      {all.length > 0 || search !== '' ? (
        <div className="mb-5 max-w-96">
          <TextField
            label="Find a site by name or address"
            type="search"
            value={search}
            onChange={(text) => {
              write((next) => {
                if (text === '') next.delete('find');
                else next.set('find', text);
              });
            }}
          />
        </div>
      ) : null}
      {sites.isPending ? (
        <Skeleton label="Reading your sites" />
      ) : sites.isError ? (
        <LoadFailed
          what="Your sites"
          error={sites.error}
          retrying={sites.isFetching}
          onRetry={() => void sites.refetch()}
        />
      ) : all.length === 0 && asked !== '' ? (
        <EmptyState
          title={`No site is called “${asked}”`}
          action={
            <Button
              onClick={() => {
                write((next) => {
                  next.delete('find');
                });
              }}
            >
              Show every site
            </Button>
          }
        >
          The name or the address must contain what you typed.
        </EmptyState>
      ) : all.length === 0 ? (
        <EmptyState title="No site yet" action={make}>
          A site is a place with one or more buildings. Make one and you become its manager, or ask the manager of a
          site to give you a role there.
        </EmptyState>
      ) : (
        <>
          <SitesTable
            sites={all}
            sort={readSort(url)}
            onSort={(sort) => {
              write((next) => {
                writeSort(next, sort);
              });
            }}
          />
          <p role="status" className="mt-4 text-small text-soft">
            {all.length} {all.length === 1 ? 'site' : 'sites'} shown{sites.hasNextPage ? '; there are more' : ''}
          </p>
          {sites.hasNextPage ? (
            <Button busy={sites.isFetchingNextPage} onClick={() => void sites.fetchNextPage()}>
              Show more sites
            </Button>
          ) : null}
        </>
      )}
    </Page>
  );
}
