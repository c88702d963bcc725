import { deleteRoom } from '@embertally/shared/survey/commands/delete-room';
import { roomHeight } from '@embertally/shared/survey/derive/room-height';
import { displayUnit } from '@embertally/shared/units/display-unit';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { ConfirmDialog } from '../../../components/confirm-dialog.tsx';
import { Disclosure } from '../../../components/disclosure.tsx';
import type { Sort } from '../../../components/sort.ts';
import { StandingMark } from '../../../components/standing-mark.tsx';
import { type Column, Table } from '../../../components/table.tsx';
import { useUnits } from '../../../lib/units-context.ts';
import { useBook } from '../../session/use-book.ts';
import { useBookSession } from '../../session/use-book-session.ts';
import { useQuantity } from '../../../lib/use-quantity.ts';
import { type RoomRow, useRoomRows } from '../../tally/use-room-rows.ts';
import { useOpenTables } from '../tables-context.ts';
import { AddRoomForm } from './add-room-form.tsx';
import { liningWords, protectionWords, wordsOfUse } from './room-words.ts';

/** The rooms of the storey as a table, and a form to add one from typed lengths. */
export function RoomsPart() {
  const session = useBookSession();
  const openTables = useOpenTables();
  const units = useUnits();
  const show = useQuantity();
  const rows = useRoomRows('storey');
  const document = useBook((state) => state.document);
  const inHand = useBook((state) => state.roomInHand);
  const canEdit = useBook((state) => state.canEdit);
  const [sort, setSort] = useState<Sort | null>(null);
  const [leaving, setLeaving] = useState<RoomRow | null>(null);
  const symbol = (unit: string): string => displayUnit(unit, units)?.symbol ?? unit;

  const columns: readonly Column<RoomRow>[] = [
    {
      key: 'name',
      header: 'Room',
      rowHeader: true,
      sortBy: (row) => row.room.name,
      cell: (row) => (
        <button
          type="button"
          className="row-name min-w-28"
          aria-current={row.room.id === inHand ? 'true' : undefined}
          onClick={() => {
            session.takeRoom(row.room.id);
          }}
        >
          {row.room.name}
          <span className="block font-normal text-soft">
            {row.room.use === null ? '' : `${wordsOfUse(row.room.use)} · `}
            {row.entries === 1 ? '1 entry' : `${row.entries} entries`}
          </span>
        </button>
      ),
    },
    {
      key: 'height',
      header: `Height, ${symbol('m')}`,
      numeric: true,
      sortBy: (row) => roomHeight(document, row.room),
      cell: (row) => show(roomHeight(document, row.room), 'm').text,
    },
    {
      key: 'area',
      header: `Area, ${symbol('m2')}`,
      numeric: true,
      sortBy: (row) => row.area_m2,
      cell: (row) => (row.area_m2 === null ? '–' : show(row.area_m2, 'm2').text),
    },
    {
      key: 'known',
      header: 'Linings, rating, protection',
      cell: (row) => (
        <span className="block min-w-44">
          {liningWords(row.room.lining)}
          <span className="block text-soft">
            {row.room.rating_min === null ? 'Not rated' : `Rated ${row.room.rating_min} min`};{' '}
            {protectionWords(row.room.protection)}
          </span>
        </span>
      ),
    },
    {
      key: 'density',
      header: `Load, ${symbol('MJ/m2')}`,
      numeric: true,
      sortBy: (row) => row.density_MJ_m2,
      cell: (row) => (
        <>
          {row.density_MJ_m2 === null ? '–' : show(row.density_MJ_m2, 'MJ/m2').text}
          {row.standing !== 'no limit set' && (
            <span className="block font-sans">
              <StandingMark standing={row.standing} />
            </span>
          )}
        </>
      ),
    },
    {
      key: 'do',
      header: canEdit ? 'Change' : 'Read',
      cell: (row) => (
        <span className="flex gap-x-1">
          <Button
            look="quiet"
            size="small"
            aria-label={canEdit ? `Edit ${row.room.name}` : `All of ${row.room.name}`}
            onClick={() => {
              session.takeRoom(row.room.id);
              openTables('room');
            }}
          >
            {canEdit ? 'Edit' : 'All of it'}
          </Button>
          {canEdit && (
            <Button
              look="quiet"
              size="small"
              aria-label={`Delete ${row.room.name}`}
              onClick={() => {
                setLeaving(row);
              }}
            >
              Delete
            </Button>
          )}
        </span>
      ),
    },
  ];

  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-4">
      {canEdit && (
        <Disclosure title="Add a room by its measures" open={rows.length === 0}>
          <AddRoomForm />
        </Disclosure>
      )}
      {rows.length === 0 ? (
        <p className="text-soft">No room on this storey yet.</p>
      ) : (
        <Table
          caption={rows.length === 1 ? '1 room on this storey' : `${rows.length} rooms on this storey`}
          columns={columns}
          rows={rows}
          rowKey={(row) => row.room.id}
          sort={sort}
          onSort={setSort}
          narrow="scroll"
        />
      )}
      <ConfirmDialog
        open={leaving !== null}
        title={`Delete ${leaving?.room.name ?? 'the room'}`}
        confirm="Delete the room"
        onClose={() => {
          setLeaving(null);
        }}
        onConfirm={() => {
          if (leaving !== null) session.run(deleteRoom, { room_id: leaving.room.id }, `Deleted ${leaving.room.name}`);
          setLeaving(null);
        }}
      >
        <p>
          {leaving?.entries === 0
            ? 'It has no contents.'
            : `Its ${leaving?.entries === 1 ? 'one entry goes' : `${leaving?.entries ?? 0} entries go`} with it.`}{' '}
          Walls and openings shared with other rooms stay. Undo brings everything back.
        </p>
      </ConfirmDialog>
    </div>
  );
}
