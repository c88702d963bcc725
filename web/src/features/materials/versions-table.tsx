import { Link } from 'react-router-dom';
import { Quantity } from '../../components/quantity.tsx';
import { Table, type Column } from '../../components/table.tsx';
import { dateWords } from '../../lib/date-words.ts';
import { paths } from '../../lib/paths.ts';
import type { OwnMaterial, VersionSummary } from './api/own-material.ts';
import { StateMark } from './state-mark.tsx';

interface VersionsTableProps {
  readonly material: OwnMaterial;
  /** The version that is shown. */
  readonly shown: number;
}

/** Every version with its heat, how far it has come, and who did what when. */
export function VersionsTable({ material, shown }: VersionsTableProps) {
  const columns: readonly Column<VersionSummary>[] = [
    {
      key: 'version',
      header: 'Version',
      rowHeader: true,
      cell: (row) => (
        <Link
          to={paths.material(material.id, row.version)}
          aria-current={row.version === shown ? 'page' : undefined}
          className="inline-block py-0.5"
        >
          Version {row.version}
        </Link>
      ),
    },
    { key: 'state', header: 'State', cell: (row) => <StateMark state={row.state} /> },
    {
      key: 'heat',
      header: 'Net heat',
      numeric: true,
      cell: (row) => <Quantity value={row.net_MJ_kg} unit="MJ/kg" />,
    },
    { key: 'who', header: 'Who and when', cell: (row) => <WhoAndWhen row={row} /> },
  ];
  return (
    <div className="pt-4">
      <Table
        caption={`Versions of ${material.label}`}
        captionUnseen
        columns={columns}
        rows={material.versions}
        rowKey={(row) => String(row.version)}
      />
    </div>
  );
}

function WhoAndWhen({ row }: { readonly row: VersionSummary }) {
  const steps = [
    { what: 'made by', who: row.author, when: row.made_at, why: null },
    ...(row.decided_at === null
      ? []
      : [
          {
            what: row.decision_reason === null ? 'approved by' : 'returned by',
            who: row.decided_by,
            when: row.decided_at,
            why: row.decision_reason,
          },
        ]),
    ...(row.withdrawn_at === null
      ? []
      : [{ what: 'withdrawn by', who: row.withdrawn_by, when: row.withdrawn_at, why: row.withdrawal_reason }]),
  ];
  return (
    <span className="text-small">
      {steps.map(({ what, who, when, why }) => (
        <span key={what} className="block">
          {what} {who ?? 'somebody who left'}, {dateWords(when, 'day')}
          {why === null ? null : <span className="block text-soft">“{why}”</span>}
        </span>
      ))}
    </span>
  );
}
