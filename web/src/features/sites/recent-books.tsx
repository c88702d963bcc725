import type { BuildingSummary, SiteSummary } from '@embertally/shared/contracts/sites';
import { useQueries } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { LoadFailed } from '../../components/load-failed.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import { dateWords } from '../../lib/date-words.ts';
import { paths } from '../../lib/paths.ts';
import { siteQuery } from './api/site.ts';

/** How many sites are looked into, and how many books are listed. */
const SITES = 5;
const BOOKS = 8;

interface RecentBooksProps {
  readonly sites: readonly SiteSummary[];
}

/** The books changed last, newest first, over the sites changed last. */
export function RecentBooks({ sites }: RecentBooksProps) {
  const looked = sites.toSorted((a, b) => b.updated_at.localeCompare(a.updated_at)).slice(0, SITES);
  const reads = useQueries({ queries: looked.map((site) => siteQuery(site.id)) });
  const failed = reads.find((read) => read.isError);
  if (failed?.error) {
    return (
      <div className="mt-4">
        <LoadFailed
          what="Recent books"
          error={failed.error}
          retrying={failed.isFetching}
          onRetry={() => {
            for (const read of reads) if (read.isError) void read.refetch();
          }}
        />
      </div>
    );
  }
  if (reads.some((read) => read.isPending)) return <Skeleton label="Reading recent books" lines={4} />;
  const books = reads
    .flatMap((read) => read.data?.building_list.map((building) => ({ building, site: read.data.name })) ?? [])
    .toSorted((a, b) => b.building.updated_at.localeCompare(a.building.updated_at))
    .slice(0, BOOKS);
  if (books.length === 0) {
    return <p className="py-4 text-soft">No book yet. Open a site and make its first building.</p>;
  }
  return (
    <ul>
      {books.map(({ building, site }) => (
        <BookLine key={building.id} building={building} site={site} />
      ))}
    </ul>
  );
}

function BookLine({ building, site }: { readonly building: BuildingSummary; readonly site: string }) {
  return (
    <li className="flex flex-wrap items-baseline justify-between gap-x-6 border-b border-rule py-3.5">
      <div className="min-w-0">
        <Link to={paths.survey(building.survey_id)} className="font-bold">
          {building.name}
        </Link>
        <p className="text-small text-soft">{site}</p>
      </div>
      <p className="text-small text-soft">
        changed <time dateTime={building.updated_at}>{dateWords(building.updated_at, 'day')}</time>
      </p>
    </li>
  );
}
