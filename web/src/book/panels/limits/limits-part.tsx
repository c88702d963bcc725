import { deleteLimit, type Limit } from '@embertally/shared/contracts/limits';
import { limitNames, limitSourceNames } from '@embertally/shared/limits/limit-names';
import { limitUnits } from '@embertally/shared/limits/limit-units';
import type { LimitStanding } from '@embertally/shared/tally/room-tally';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { ConfirmDialog } from '../../../components/confirm-dialog.tsx';
import { Disclosure } from '../../../components/disclosure.tsx';
import { Notice } from '../../../components/notice.tsx';
import { Quantity } from '../../../components/quantity.tsx';
import { StandingMark } from '../../../components/standing-mark.tsx';
import { type Column, Table } from '../../../components/table.tsx';
import { call } from '../../../lib/api-client.ts';
import { dateWords } from '../../../lib/date-words.ts';
import { useBook } from '../../session/use-book.ts';
import { useBookSession } from '../../session/use-book-session.ts';
import { useRoomTally } from '../../session/use-room-tally.ts';
import { LimitForm } from './limit-form.tsx';
import { limitFailure, type LimitFailure } from './limit-failure.ts';
import { maySetLimit } from './may-set-limit.ts';
import { readLimits } from './read-limits.ts';

interface Row {
  readonly limit: Limit;
  readonly stood: LimitStanding | undefined;
}

/** The limits on the room in hand: who set them, how the room stands, and a form to set one. */
export function LimitsPart() {
  const session = useBookSession();
  const room = useBook((state) => state.document.rooms.get(state.roomInHand ?? ''));
  const limits = useBook((state) => state.limits);
  const survey = useBook((state) => state.survey);
  const tally = useRoomTally(room?.id ?? null);
  const [editing, setEditing] = useState<Limit | null>(null);
  const [leaving, setLeaving] = useState<Limit | null>(null);
  const [busy, setBusy] = useState(false);
  const [failure, setFailure] = useState<LimitFailure | null>(null);
  if (room === undefined) return <p className="text-soft">No room is in hand: choose one under Rooms.</p>;
  const rows = limits
    .filter((limit) => limit.room_id === room.id)
    .map((limit, index): Row => ({ limit, stood: tally?.limits[index] }));

  const take = async (limit: Limit): Promise<void> => {
    setBusy(true);
    setFailure(null);
    try {
      await call(deleteLimit, { params: { limitId: limit.id }, ifMatch: limit.version });
      session.setLimits(session.state.limits.filter((other) => other.id !== limit.id));
      session.announce('Took the limit away');
    } catch (error) {
      setFailure(limitFailure(error));
      await readLimits(session).catch((again: unknown) => {
        setFailure(limitFailure(again));
      });
    } finally {
      setBusy(false);
      setLeaving(null);
    }
  };

  const columns: readonly Column<Row>[] = [
    { key: 'what', header: 'Limit on', rowHeader: true, cell: ({ limit }) => limitNames[limit.quantity] },
    {
      key: 'bound',
      header: 'At most',
      numeric: true,
      cell: ({ limit }) => <Quantity value={limit.bound} unit={limitUnits[limit.quantity]} />,
    },
    {
      key: 'now',
      header: 'Now',
      numeric: true,
      cell: ({ limit, stood }) =>
        stood?.value?.value == null ? '–' : <Quantity value={stood.value.value} unit={limitUnits[limit.quantity]} />,
    },
    {
      key: 'standing',
      header: 'Standing',
      cell: ({ stood }) => (stood === undefined ? '–' : <StandingMark standing={stood.standing} />),
    },
    {
      key: 'by',
      header: 'Set by',
      cell: ({ limit }) => (
        <>
          {limitSourceNames[limit.source]}: {limit.set_by}
          <span className="block text-soft">since {dateWords(limit.since, 'day')}</span>
        </>
      ),
    },
    {
      key: 'do',
      header: 'Change',
      cell: ({ limit }) =>
        maySetLimit(survey, limit.source) ? (
          <span className="flex flex-wrap gap-x-3">
            <Button
              look="quiet"
              size="small"
              aria-label={`Edit the limit on ${limitNames[limit.quantity].toLowerCase()}`}
              onClick={() => {
                setFailure(null);
                setEditing(limit);
              }}
            >
              Edit
            </Button>
            <Button
              look="quiet"
              size="small"
              aria-label={`Take away the limit on ${limitNames[limit.quantity].toLowerCase()}`}
              onClick={() => {
                setFailure(null);
                setLeaving(limit);
              }}
            >
              Take away
            </Button>
          </span>
        ) : (
          <span className="text-soft">set by others</span>
        ),
    },
  ];
  const maySet = maySetLimit(survey, 'house-rule');
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-4">
      {failure !== null && (
        <Notice tone="problem" title={failure.title} announced>
          {failure.text}
        </Notice>
      )}
      {rows.length === 0 ? (
        <p className="max-w-[60ch] text-soft">
          No limit is set on {room.name}. A limit is a bound that somebody named has set: a permit, a policy clause or a
          rule of the house.
        </p>
      ) : (
        <Table
          caption={`Limits on ${room.name}`}
          columns={columns}
          rows={rows}
          rowKey={({ limit }) => limit.id}
          narrow="scroll"
        />
      )}
      {editing !== null && (
        <section aria-label="Edit a limit" className="border-y border-rule py-3">
          <h3 className="mb-3 font-bold">Edit the limit on {limitNames[editing.quantity].toLowerCase()}</h3>
          <LimitForm
            key={editing.id}
            room={room}
            limit={editing}
            onDone={() => {
              setEditing(null);
            }}
          />
        </section>
      )}
      {maySet && editing === null && (
        <Disclosure title={`Set a limit on ${room.name}`} open={rows.length === 0}>
          <LimitForm key={room.id} room={room} limit={null} onDone={() => undefined} />
        </Disclosure>
      )}
      <ConfirmDialog
        open={leaving !== null}
        title="Take the limit away"
        confirm="Take it away"
        busy={busy}
        onClose={() => {
          setLeaving(null);
        }}
        onConfirm={() => {
          if (leaving !== null) void take(leaving);
        }}
      >
        <p>
          {leaving === null
            ? ''
            : `${room.name} is then no longer held to what ${leaving.set_by} set. This is kept in the site’s history; undo does not bring it back.`}
        </p>
      </ConfirmDialog>
    </div>
  );
}
