import type { BuildingSummary, SiteSummary } from '@embertally/shared/contracts/sites';
import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { LoadFailed } from '../../components/load-failed.tsx';
import { Quantity } from '../../components/quantity.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import { StandingMark } from '../../components/standing-mark.tsx';
import { paths } from '../../lib/paths.ts';
import { roomSummariesQuery } from '../../lib/room-summaries.ts';
import { siteQuery } from './api/site.ts';
import { roomsToWatch } from './rooms-to-watch.ts';
import { StandingCounts } from './standing-counts.tsx';

/** How many sites are opened up into their rooms; the rest keep their counts. */
const OPENED = 5;

interface WaitingListProps {
  readonly sites: readonly SiteSummary[];
}

/** Sites with rooms over or near a limit, the most over first, and which rooms those are. */
export function WaitingList({ sites }: WaitingListProps) {
  const waiting = sites
    .filter((site) => site.rooms_over > 0 || site.rooms_near > 0)
    .toSorted((a, b) => b.rooms_over - a.rooms_over || b.rooms_near - a.rooms_near);
  if (waiting.length === 0) {
    return <p className="py-4 text-soft">Nothing waits for you: no room you may see is near or over a limit.</p>;
  }
  return (
    <ul>
      {waiting.map((site, index) => (
        <li key={site.id} className="border-b border-rule py-3.5">
          <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1">
            <Link to={paths.site(site.id)} className="text-lead font-bold">
              {site.name}
            </Link>
            <StandingCounts rooms={site.rooms} over={site.rooms_over} near={site.rooms_near} />
          </div>
          <p className="text-soft">You are {site.my_role} here</p>
          {index < OPENED ? <WaitingSite siteId={site.id} /> : null}
        </li>
      ))}
    </ul>
  );
}

function WaitingSite({ siteId }: { readonly siteId: string }) {
  const site = useQuery(siteQuery(siteId));
  if (site.isPending) return <Skeleton label="Reading the buildings" lines={2} />;
  if (site.isError) {
    return (
      <LoadFailed
        what="The buildings"
        error={site.error}
        retrying={site.isFetching}
        onRetry={() => void site.refetch()}
      />
    );
  }
  const buildings = site.data.building_list.filter((building) => building.rooms_over + building.rooms_near > 0);
  return buildings.map((building) => <WaitingRooms key={building.id} building={building} />);
}

function WaitingRooms({ building }: { readonly building: BuildingSummary }) {
  const summaries = useQuery(roomSummariesQuery(building.survey_id));
  if (summaries.isPending) return <Skeleton label={`Reading the rooms of ${building.name}`} lines={2} />;
  if (summaries.isError) {
    return (
      <LoadFailed
        what={`The rooms of ${building.name}`}
        error={summaries.error}
        retrying={summaries.isFetching}
        onRetry={() => void summaries.refetch()}
      />
    );
  }
  return (
    <ul className="mt-3" aria-label={`Rooms near or over a limit in ${building.name}`}>
      {roomsToWatch(summaries.data.items).map((room) => (
        <li
          key={room.room_id}
          className="grid grid-cols-[minmax(0,1fr)_auto_5rem] items-baseline gap-x-4 border-t border-rule py-1.5"
        >
          <span className="min-w-0">
            <Link to={paths.survey(building.survey_id)} className="text-ink decoration-rule hover:text-verdigris">
              {room.name}
            </Link>
            <span className="block text-small text-soft tablet:inline tablet:before:content-['_']">
              {building.name}
            </span>
          </span>
          <span className="text-right">
            {room.load_per_floor_MJ_m2 === null ? '–' : <Quantity value={room.load_per_floor_MJ_m2} unit="MJ/m2" />}
          </span>
          <span className="text-right">
            <StandingMark standing={room.standing} />
          </span>
        </li>
      ))}
    </ul>
  );
}
