import { Quantity } from '../../components/quantity.tsx';
import { Range } from '../../components/range.tsx';
import type { Sort } from '../../components/sort.ts';
import { Table, type Column } from '../../components/table.tsx';
import type { CatalogueKind } from './api/kinds.ts';
import { SourceNote } from './source-note.tsx';

function mass(kind: CatalogueKind): number {
  return kind.parts.reduce((sum, part) => sum + part.mass_kg, 0);
}

const COLUMNS: readonly Column<CatalogueKind>[] = [
  {
    key: 'name',
    header: 'Kind',
    rowHeader: true,
    sortBy: (row) => row.label,
    cell: (row) => (
      <>
        {row.label}
        <span className="block text-small font-normal text-soft">
          {[row.group, row.keeping, ...row.hazards].join(', ')}
        </span>
      </>
    ),
  },
  { key: 'mass', header: 'Mass', numeric: true, sortBy: mass, cell: (row) => <Quantity value={mass(row)} unit="kg" /> },
  {
    key: 'range',
    header: 'Low – high',
    numeric: true,
    cell: (row) => <Range low={row.mass_low_kg} high={row.mass_high_kg} unit="kg" />,
  },
  {
    key: 'peak',
    header: 'Peak heat release',
    numeric: true,
    sortBy: (row) => row.peak_kW,
    emptyOnNarrow: (row) => row.peak_kW === null,
    cell: (row) => (row.peak_kW === null ? '–' : <Quantity value={row.peak_kW} unit="kW" />),
  },
  {
    key: 'growth',
    header: 'Growth',
    sortBy: (row) => row.growth,
    emptyOnNarrow: (row) => row.growth === null,
    cell: (row) => row.growth ?? '–',
  },
  { key: 'source', header: 'Source', cell: (row) => <SourceNote source={row.source} /> },
];

interface KindsTableProps {
  readonly kinds: readonly CatalogueKind[];
  readonly sort: Sort | null;
  readonly onSort: (sort: Sort) => void;
}

/** Kinds with the mass of one piece, its peak, and where the figures come from. */
export function KindsTable({ kinds, sort, onSort }: KindsTableProps) {
  return (
    <Table
      caption="One piece as usually found; every figure can be changed where the entry is placed."
      columns={COLUMNS}
      rows={kinds}
      rowKey={(row) => row.key}
      sort={sort}
      onSort={onSort}
    />
  );
}
