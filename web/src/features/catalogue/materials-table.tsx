import { Link } from 'react-router-dom';
import { Range } from '../../components/range.tsx';
import { Quantity } from '../../components/quantity.tsx';
import type { Sort } from '../../components/sort.ts';
import { Table, type Column } from '../../components/table.tsx';
import type { CatalogueMaterial } from '../../lib/catalogue-materials.ts';
import { paths } from '../../lib/paths.ts';
import { SourceNote } from './source-note.tsx';

const COLUMNS: readonly Column<CatalogueMaterial>[] = [
  {
    key: 'name',
    header: 'Material',
    rowHeader: true,
    sortBy: (row) => row.label,
    cell: (row) => (
      <>
        <Link to={paths.material(row.key)} className="inline-block py-0.5">
          {row.label}
        </Link>
        {row.own === null ? null : <span className="ml-2 font-normal text-soft">own, version {row.own.version}</span>}
        {row.hazards.length === 0 ? null : (
          <span className="block text-small font-normal text-soft">{row.hazards.join(', ')}</span>
        )}
      </>
    ),
  },
  { key: 'group', header: 'Group', sortBy: (row) => row.group, cell: (row) => row.group },
  {
    key: 'heat',
    header: 'Net heat',
    numeric: true,
    sortBy: (row) => row.net_heat_MJ_kg,
    cell: (row) => <Quantity value={row.net_heat_MJ_kg} unit="MJ/kg" />,
  },
  {
    key: 'range',
    header: 'Low – high',
    numeric: true,
    cell: (row) => <Range low={row.low_MJ_kg} high={row.high_MJ_kg} unit="MJ/kg" />,
  },
  {
    key: 'density',
    header: 'Kept in bulk',
    numeric: true,
    sortBy: (row) => row.bulk_density_kg_m3?.typical ?? null,
    emptyOnNarrow: (row) => row.bulk_density_kg_m3 === null,
    cell: (row) =>
      row.bulk_density_kg_m3 === null ? '–' : <Quantity value={row.bulk_density_kg_m3.typical} unit="kg/m3" />,
  },
  { key: 'source', header: 'Source', cell: (row) => <SourceNote source={row.source} /> },
];

interface MaterialsTableProps {
  readonly materials: readonly CatalogueMaterial[];
  readonly sort: Sort | null;
  readonly onSort: (sort: Sort) => void;
}

/** Materials with their net heats, low to high, and where the figures come from. */
export function MaterialsTable({ materials, sort, onSort }: MaterialsTableProps) {
  return (
    <Table
      caption="Heats are net: the water formed leaves as vapour. Low to high is the plausible range of the material as found."
      columns={COLUMNS}
      rows={materials}
      rowKey={(row) => row.key}
      sort={sort}
      onSort={onSort}
    />
  );
}
