import type { SiteSummary } from '@embertally/shared/contracts/sites';
import { Link } from 'react-router-dom';
import type { Sort } from '../../components/sort.ts';
import { Table, type Column } from '../../components/table.tsx';
import { paths } from '../../lib/paths.ts';
import { StandingCounts } from './standing-counts.tsx';

const COLUMNS: readonly Column<SiteSummary>[] = [
  {
    key: 'name',
    header: 'Site',
    rowHeader: true,
    sortBy: (site) => site.name,
    cell: (site) => (
      <>
        <Link to={paths.site(site.id)} className="text-ink decoration-rule hover:text-verdigris">
          {site.name}
        </Link>
        {site.address === '' ? null : <span className="block font-normal text-soft">{site.address}</span>}
      </>
    ),
  },
  { key: 'keeper', header: 'Kept by', sortBy: (site) => site.keeper.name, cell: (site) => site.keeper.name },
  { key: 'role', header: 'My role', sortBy: (site) => site.my_role, cell: (site) => site.my_role },
  { key: 'buildings', header: 'Buildings', numeric: true, sortBy: (site) => site.buildings, cell: (s) => s.buildings },
  { key: 'rooms', header: 'Rooms', numeric: true, sortBy: (site) => site.rooms, cell: (site) => site.rooms },
  {
    key: 'standing',
    header: 'Near or over a limit',
    sortBy: (site) => site.rooms_over * 10_000 + site.rooms_near,
    cell: (site) => <StandingCounts rooms={site.rooms} over={site.rooms_over} near={site.rooms_near} />,
  },
];

interface SitesTableProps {
  readonly sites: readonly SiteSummary[];
  readonly sort: Sort | null;
  readonly onSort: (sort: Sort) => void;
}

/** The sites a person may see, one line each. */
export function SitesTable({ sites, sort, onSort }: SitesTableProps) {
  return (
    <Table
      caption="Sites you have a role on"
      captionUnseen
      columns={COLUMNS}
      rows={sites}
      rowKey={(site) => site.id}
      sort={sort}
      onSort={onSort}
    />
  );
}
