import { addStorey } from '@embertally/shared/survey/commands/add-storey';
import { deleteStorey } from '@embertally/shared/survey/commands/delete-storey';
import { editStorey, type EditStoreyInput } from '@embertally/shared/survey/commands/edit-storey';
import { entriesOfRoom } from '@embertally/shared/survey/derive/entries-of-room';
import { roomsOfStorey } from '@embertally/shared/survey/derive/rooms-of-storey';
import { newStorey } from '@embertally/shared/survey/new-storey';
import type { Storey } from '@embertally/shared/survey/survey-document';
import { displayUnit } from '@embertally/shared/units/display-unit';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { ConfirmDialog } from '../../../components/confirm-dialog.tsx';
import { type Column, Table } from '../../../components/table.tsx';
import { useUnits } from '../../../lib/units-context.ts';
import { useBook } from '../../session/use-book.ts';
import { useBookSession } from '../../session/use-book-session.ts';
import { CommandQuantity } from '../command-quantity.tsx';
import { CommandText } from '../command-text.tsx';
import { useRunBack } from '../run-back.ts';

type Length = 'level_m' | 'height_m' | 'wall_thickness_m';
const LENGTHS: readonly {
  readonly field: Length;
  readonly label: string;
  readonly minimum: number;
  readonly maximum: number;
}[] = [
  { field: 'level_m', label: 'Level', minimum: -10_000, maximum: 10_000 },
  { field: 'height_m', label: 'Height', minimum: 0.5, maximum: 100 },
  { field: 'wall_thickness_m', label: 'Wall thickness', minimum: 0, maximum: 2 },
];

/** The storeys of the building. */
export function StoreysPart() {
  const session = useBookSession();
  const units = useUnits();
  const runBack = useRunBack();
  const document = useBook((state) => state.document);
  const storeyId = useBook((state) => state.storeyId);
  const canEdit = useBook((state) => state.canEdit);
  const [leaving, setLeaving] = useState<Storey | null>(null);
  const storeys = [...document.storeys.values()].sort((a, b) => b.level_m - a.level_m);
  const metre = displayUnit('m', units)?.symbol ?? 'm';
  const edit = (storey: Storey, patch: EditStoreyInput['patch']) =>
    runBack(editStorey, { storey_id: storey.id, patch }, `Changed ${storey.name}`);
  const countOf = (storey: Storey) => {
    const rooms = roomsOfStorey(document, storey.id);
    return {
      rooms: rooms.length,
      entries: rooms.reduce((sum, room) => sum + entriesOfRoom(document, room.id).length, 0),
    };
  };
  const add = (): void => {
    const top = storeys[0];
    const storey = newStorey({
      id: session.newId(),
      name: `Storey ${storeys.length + 1}`,
      ...(top === undefined
        ? {}
        : {
            level_m: top.level_m + top.height_m,
            height_m: top.height_m,
            wall_thickness_m: top.wall_thickness_m,
          }),
    });
    const result = session.run(addStorey, { storey }, `Added ${storey.name}`);
    if (!result.refused) session.goToStorey(storey.id);
  };

  const columns: readonly Column<Storey>[] = [
    {
      key: 'name',
      header: 'Storey',
      rowHeader: true,
      cell: (storey) =>
        canEdit ? (
          <CommandText
            label={`Name of ${storey.name}`}
            labelUnseen
            compact
            value={storey.name}
            run={(name) => edit(storey, { name })}
          />
        ) : (
          storey.name
        ),
    },
    ...LENGTHS.map(({ field, label, minimum, maximum }): Column<Storey> => ({
      key: field,
      header: `${label}, ${metre}`,
      numeric: true,
      cell: (storey) =>
        canEdit ? (
          <CommandQuantity
            label={`${label} of ${storey.name}`}
            labelUnseen
            compact
            unit="m"
            value={storey[field]}
            minimum={minimum}
            maximum={maximum}
            run={(value) => edit(storey, { [field]: value })}
          />
        ) : (
          formatQuantity(storey[field], 'm', units, { figures: 'as entered' }).text
        ),
    })),
    { key: 'rooms', header: 'Rooms', numeric: true, cell: (storey) => countOf(storey).rooms },
    {
      key: 'do',
      header: 'Go',
      cell: (storey) => (
        <span className="flex flex-wrap gap-x-3">
          <Button
            look="quiet"
            size="small"
            aria-label={storey.id === storeyId ? `${storey.name} lies open` : `Open ${storey.name}`}
            onClick={() => {
              session.goToStorey(storey.id);
            }}
          >
            {storey.id === storeyId ? 'Lies open' : 'Open'}
          </Button>
          {canEdit && storeys.length > 1 && (
            <Button
              look="quiet"
              size="small"
              aria-label={`Delete ${storey.name}`}
              onClick={() => {
                setLeaving(storey);
              }}
            >
              Delete
            </Button>
          )}
        </span>
      ),
    },
  ];
  const goes = leaving === null ? { rooms: 0, entries: 0 } : countOf(leaving);
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-4">
      <Table
        caption="Storeys, from the top down. Rooms are drawn on wall centre lines; half the wall thickness is taken off."
        columns={columns}
        rows={storeys}
        rowKey={(storey) => storey.id}
        narrow="scroll"
      />
      {canEdit && (
        <Button className="justify-self-start" onClick={add}>
          Add a storey
        </Button>
      )}
      <ConfirmDialog
        open={leaving !== null}
        title={`Delete ${leaving?.name ?? 'the storey'}`}
        confirm="Delete the storey"
        onClose={() => {
          setLeaving(null);
        }}
        onConfirm={() => {
          if (leaving !== null) session.run(deleteStorey, { storey_id: leaving.id }, `Deleted ${leaving.name}`);
          setLeaving(null);
        }}
      >
        <p>
          {goes.rooms === 1 ? 'One room goes' : `${goes.rooms} rooms go`} with it, and{' '}
          {goes.entries === 1 ? 'one entry' : `${goes.entries} entries`}. Undo brings everything back.
        </p>
      </ConfirmDialog>
    </div>
  );
}
