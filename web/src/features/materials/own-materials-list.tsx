import { useInfiniteQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { Button } from '../../components/button.tsx';
import { EmptyState } from '../../components/empty-state.tsx';
import { LinkButton } from '../../components/link-button.tsx';
import { LoadFailed } from '../../components/load-failed.tsx';
import { Quantity } from '../../components/quantity.tsx';
import { Range } from '../../components/range.tsx';
import { SelectField } from '../../components/select-field.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import { Table, type Column } from '../../components/table.tsx';
import { dateWords } from '../../lib/date-words.ts';
import { paths } from '../../lib/paths.ts';
import { ownMaterialsQuery, type OwnMaterialSummary, type VersionState } from './api/own-materials.ts';
import { StateMark, STATE_WORDS } from './state-mark.tsx';
import { isWay, WAY_WORDS } from './way-words.ts';

interface OwnMaterialsListProps {
  readonly typed: string;
  readonly state: VersionState | null;
  readonly onState: (state: VersionState | null) => void;
  readonly onShowAll: () => void;
}

const STATES = [
  { value: '', label: 'In every state' },
  ...Object.entries(STATE_WORDS).map(([value, word]) => ({
    value,
    label: word.charAt(0).toUpperCase() + word.slice(1),
  })),
];

const COLUMNS: readonly Column<OwnMaterialSummary>[] = [
  {
    key: 'name',
    header: 'Material',
    rowHeader: true,
    cell: (row) => (
      <>
        <Link to={paths.material(row.id)} className="inline-block py-0.5">
          {row.label}
        </Link>
        <span className="block text-small font-normal text-soft">
          {isWay(row.latest.way) ? WAY_WORDS[row.latest.way].title : row.latest.way}
          {row.latest.has_curve ? ', with a measured curve' : ''}
        </span>
      </>
    ),
  },
  {
    key: 'state',
    header: 'Newest version',
    cell: (row) => (
      <>
        {row.latest.version} <StateMark state={row.latest.state} />
        {row.in_force === null || row.in_force === row.latest.version ? null : (
          <span className="block text-small text-soft">version {row.in_force} is placed now</span>
        )}
      </>
    ),
  },
  {
    key: 'heat',
    header: 'Net heat',
    numeric: true,
    cell: (row) => <Quantity value={row.latest.net_MJ_kg} unit="MJ/kg" />,
  },
  {
    key: 'range',
    header: 'Low – high',
    numeric: true,
    cell: (row) => <Range low={row.latest.low_MJ_kg} high={row.latest.high_MJ_kg} unit="MJ/kg" />,
  },
  {
    key: 'who',
    header: 'Made by',
    cell: (row) => (
      <span className="text-small">
        {row.latest.author}
        <span className="block text-soft">{dateWords(row.latest.made_at, 'day')}</span>
      </span>
    ),
  },
];

/** The organisation's own materials in each state: who made them, how far they have come. */
export function OwnMaterialsList({ typed, state, onState, onShowAll }: OwnMaterialsListProps) {
  const read = useInfiniteQuery(ownMaterialsQuery(typed.trim(), state));
  const rows = read.data?.pages.flatMap((page) => page.items) ?? [];
  const narrowed = typed.trim() !== '' || state !== null;
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-4">
      <SelectField
        label="State of the newest version"
        width="medium"
        value={state ?? ''}
        options={STATES}
        onChange={(value) => {
          onState(value === '' ? null : (value as VersionState));
        }}
      />
      {read.isPending ? <Skeleton label="Reading your own materials" /> : null}
      {read.isError ? (
        <LoadFailed
          what="Your own materials"
          error={read.error}
          retrying={read.isFetching}
          onRetry={() => void read.refetch()}
        />
      ) : null}
      {read.isSuccess && rows.length === 0 ? (
        <EmptyState
          title={narrowed ? 'No material of your own fits' : 'No material of your own yet'}
          action={
            narrowed ? (
              <Button onClick={onShowAll}>Show all of your own</Button>
            ) : (
              <LinkButton to={paths.newMaterial()} look="primary">
                Add a material
              </LinkButton>
            )
          }
        >
          {narrowed
            ? 'Try another part of its name, or every state.'
            : 'A material of your own comes from a supplier’s sheet, a laboratory’s report, a formula or other materials. When another member of your organisation has approved it, it can be placed like the built-in ones.'}
        </EmptyState>
      ) : null}
      {rows.length === 0 ? null : (
        <Table caption="Own materials" captionUnseen columns={COLUMNS} rows={rows} rowKey={(row) => row.id} />
      )}
      {read.hasNextPage ? (
        <div>
          <Button busy={read.isFetchingNextPage} onClick={() => void read.fetchNextPage()}>
            Show more
          </Button>
        </div>
      ) : null}
    </div>
  );
}
