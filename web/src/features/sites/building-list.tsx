import type { BuildingSummary } from '@embertally/shared/contracts/sites';
import { Link } from 'react-router-dom';
import { paths } from '../../lib/paths.ts';
import { StandingCounts } from './standing-counts.tsx';

interface BuildingListProps {
  readonly buildings: readonly BuildingSummary[];
}

function counted(count: number, one: string, many: string): string {
  return `${count} ${count === 1 ? one : many}`;
}

/** The buildings of a site; each opens its Book. */
export function BuildingList({ buildings }: BuildingListProps) {
  return (
    <ul>
      {buildings.map((building) => (
        <li
          key={building.id}
          className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1 border-b border-rule py-3.5"
        >
          <div>
            <Link to={paths.survey(building.survey_id)} className="text-lead font-bold">
              {building.name}
            </Link>
            <p className="text-soft">
              {counted(building.storeys, 'storey', 'storeys')} · {counted(building.rooms, 'room', 'rooms')}
            </p>
          </div>
          <StandingCounts rooms={building.rooms} over={building.rooms_over} near={building.rooms_near} />
        </li>
      ))}
    </ul>
  );
}
