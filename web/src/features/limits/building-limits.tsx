import { useQuery } from '@tanstack/react-query';
import { LoadFailed } from '../../components/load-failed.tsx';
import { Quantity } from '../../components/quantity.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import { StandingMark } from '../../components/standing-mark.tsx';
import { Table, type Column } from '../../components/table.tsx';
import { dateWords } from '../../lib/date-words.ts';
import { LIMIT_QUANTITIES, LIMIT_SOURCES } from '../../lib/limit-words.ts';
import { roomSummariesQuery } from '../../lib/room-summaries.ts';
import { limitsQuery } from './api/limits.ts';
import { limitRows, type LimitRow } from './limit-rows.ts';

interface BuildingLimitsProps {
  readonly buildingId: string;
  readonly buildingName: string;
  readonly surveyId: string;
}

function unitOf(row: LimitRow): string {
  return LIMIT_QUANTITIES[row.limit.quantity].unit;
}

const COLUMNS: readonly Column<LimitRow>[] = [
  {
    key: 'room',
    header: 'Room',
    rowHeader: true,
    cell: (row) => (
      <>
        {row.roomName}
        <span className="block text-small font-normal text-soft wide:whitespace-nowrap">
          {LIMIT_QUANTITIES[row.limit.quantity].label}
        </span>
      </>
    ),
  },
  {
    key: 'value',
    header: 'Now',
    numeric: true,
    cell: (row) =>
      row.value === null ? (
        <span className="font-sans text-soft">in the Book</span>
      ) : (
        <Quantity value={row.value} unit={unitOf(row)} />
      ),
  },
  {
    key: 'bound',
    header: 'Limit',
    numeric: true,
    cell: (row) => <Quantity value={row.limit.bound} unit={unitOf(row)} />,
  },
  {
    key: 'set-by',
    header: 'Set by',
    cell: (row) => (
      <>
        {row.limit.set_by}
        <span className="block text-small text-soft">
          {LIMIT_SOURCES[row.limit.source]}, since {dateWords(row.limit.since, 'day')}
        </span>
      </>
    ),
  },
  {
    key: 'standing',
    header: 'Standing',
    cell: (row) =>
      row.value === null ? <span className="text-soft">–</span> : <StandingMark standing={row.standing} />,
  },
];

/** The limits on the rooms of one building and how the rooms stand against them. */
export function BuildingLimits({ buildingId, buildingName, surveyId }: BuildingLimitsProps) {
  const limits = useQuery(limitsQuery(buildingId));
  const summaries = useQuery(roomSummariesQuery(surveyId));
  if (limits.isPending || summaries.isPending)
    return <Skeleton label={`Reading the limits of ${buildingName}`} lines={3} />;
  const failed = limits.isError ? limits : summaries.isError ? summaries : null;
  if (failed !== null) {
    return (
      <div className="mt-4">
        <LoadFailed
          what={`The limits of ${buildingName}`}
          error={failed.error}
          retrying={failed.isFetching}
          onRetry={() => void failed.refetch()}
        />
      </div>
    );
  }
  if (!limits.data || !summaries.data) return null;
  const rows = limitRows(limits.data.items, summaries.data.items);
  if (rows.length === 0) {
    return (
      <p className="py-3 text-soft">
        No limit is set in {buildingName}. Limits are set on a room, in the Book, by somebody named.
      </p>
    );
  }
  return (
    <Table
      caption={`Limits in ${buildingName}`}
      captionUnseen
      columns={COLUMNS}
      rows={rows}
      rowKey={(row) => row.limit.id}
    />
  );
}
