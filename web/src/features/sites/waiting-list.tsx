import type { SiteSummary } from '@embertally/shared/contracts/sites';
import { Link } from 'react-router-dom';
import { paths } from '../../lib/paths.ts';
import { StandingCounts } from './standing-counts.tsx';

interface WaitingListProps {
  readonly sites: readonly SiteSummary[];
}

/** Sites with rooms over or near a limit, the most over first. */
export function WaitingList({ sites }: WaitingListProps) {
  const waiting = sites
    .filter((site) => site.rooms_over > 0 || site.rooms_near > 0)
    .toSorted((a, b) => b.rooms_over - a.rooms_over || b.rooms_near - a.rooms_near);
  if (waiting.length === 0) {
    return <p className="py-4 text-soft">Nothing waits for you: no room you may see is near or over a limit.</p>;
  }
  return (
    <ul>
      {waiting.map((site) => (
        <li
          key={site.id}
          className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1 border-b border-rule py-3.5"
        >
          <div className="min-w-0">
            <Link to={paths.site(site.id)} className="text-lead font-bold">
              {site.name}
            </Link>
            <p className="text-soft">
              {site.rooms} rooms · you are {site.my_role} here
            </p>
          </div>
          <StandingCounts rooms={site.rooms} over={site.rooms_over} near={site.rooms_near} />
        </li>
      ))}
    </ul>
  );
}
