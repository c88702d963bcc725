import { deleteOpening } from '@embertally/shared/survey/commands/delete-opening';
import { editOpening, type EditOpeningInput } from '@embertally/shared/survey/commands/edit-opening';
import { moveOpening } from '@embertally/shared/survey/commands/move-opening';
import { wallKey } from '@embertally/shared/survey/derive/wall-key';
import type { Opening, Room } from '@embertally/shared/survey/survey-document';
import { displayUnit } from '@embertally/shared/units/display-unit';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { Button } from '../../../components/button.tsx';
import { type Column, Table } from '../../../components/table.tsx';
import { useUnits } from '../../../lib/units-context.ts';
import { useBook } from '../../session/use-book.ts';
import { useBookSession } from '../../session/use-book-session.ts';
import { CommandChoice } from '../command-choice.tsx';
import { CommandQuantity } from '../command-quantity.tsx';
import { useRunBack } from '../run-back.ts';
import { useRowFocus } from '../use-row-focus.ts';
import { OPENING_KINDS, OPENING_STATES, openingName } from './opening-words.ts';
import { type NamedWall, namedWalls } from './wall-words.ts';

interface OpeningsTableProps {
  readonly room: Room;
  readonly openings: readonly Opening[];
  readonly canEdit: boolean;
}

type Length = 'offset_m' | 'width_m' | 'height_m' | 'sill_m';
const LENGTHS: readonly { readonly field: Length; readonly label: string; readonly minimum: number }[] = [
  { field: 'offset_m', label: 'From start', minimum: 0 },
  { field: 'width_m', label: 'Width', minimum: 0.05 },
  { field: 'height_m', label: 'Height', minimum: 0.05 },
  { field: 'sill_m', label: 'Sill', minimum: 0 },
];

const wallWords = (wall: NamedWall | undefined): string =>
  wall === undefined ? '' : `${wall.side}, to ${wall.beyond.length === 0 ? 'outside' : wall.beyond.join(', ')}`;

/** The openings of a room, changed where they stand. */
export function OpeningsTable({ room, openings, canEdit }: OpeningsTableProps) {
  const session = useBookSession();
  const units = useUnits();
  const runBack = useRunBack();
  const document = useBook((state) => state.document);
  const walls = namedWalls(document, room);
  const { rootRef, focusAfter } = useRowFocus<HTMLDivElement>();
  const metre = displayUnit('m', units)?.symbol ?? 'm';
  const edit = (opening: Opening, patch: EditOpeningInput['patch']) =>
    runBack(editOpening, { opening_id: opening.id, patch }, `Changed ${openingName(opening)}`);
  const wallOf = (opening: Opening) => walls.find((wall) => wall.key === wallKey(...opening.wall));

  const columns: readonly Column<Opening>[] = [
    {
      key: 'what',
      header: 'Opening and its wall',
      rowHeader: true,
      cell: (opening) =>
        canEdit ? (
          <div className="grid gap-1">
            <CommandChoice
              label={`What ${openingName(opening)} is`}
              labelUnseen
              compact
              value={opening.kind}
              options={OPENING_KINDS}
              run={(kind) => edit(opening, { kind })}
            />
            <CommandChoice
              label={`Wall of ${openingName(opening)}`}
              labelUnseen
              compact
              value={wallKey(...opening.wall)}
              options={walls.map((wall, index) => ({ value: wall.key, label: `${index + 1}: ${wallWords(wall)}` }))}
              run={(key) => {
                const wall = walls.find((candidate) => candidate.key === key)?.wall ?? opening.wall;
                const input = { opening_id: opening.id, wall, offset_m: 0 };
                return runBack(moveOpening, input, `Moved ${openingName(opening)}`);
              }}
            />
          </div>
        ) : (
          <>
            {openingName(opening)}
            <span className="block font-normal text-soft">{wallWords(wallOf(opening))}</span>
          </>
        ),
    },
    ...LENGTHS.map(({ field, label, minimum }): Column<Opening> => ({
      key: field,
      header: `${label}, ${metre}`,
      numeric: true,
      cell: (opening) =>
        canEdit ? (
          <CommandQuantity
            label={`${label} of ${openingName(opening)}`}
            labelUnseen
            compact
            unit="m"
            value={opening[field]}
            minimum={minimum}
            maximum={1000}
            run={(value) => edit(opening, { [field]: value })}
          />
        ) : (
          formatQuantity(opening[field], 'm', units, { figures: 'as entered' }).text
        ),
    })),
    {
      key: 'state',
      header: 'State',
      cell: (opening) =>
        canEdit ? (
          <CommandChoice
            label={`State of ${openingName(opening)}`}
            labelUnseen
            compact
            value={opening.state}
            options={OPENING_STATES.map(({ value, label }) => ({ value, label: value === 'fails' ? 'fails' : label }))}
            run={(state) => edit(opening, { state })}
          />
        ) : (
          OPENING_STATES.find((state) => state.value === opening.state)?.label
        ),
    },
    ...(canEdit
      ? [
          {
            key: 'do',
            header: 'Change',
            cell: (opening: Opening) => (
              <Button
                look="quiet"
                size="small"
                data-row-action={opening.id}
                aria-label={`Delete ${openingName(opening)}`}
                onClick={() => {
                  focusAfter(opening.id);
                  session.run(deleteOpening, { opening_ids: [opening.id] }, `Deleted ${openingName(opening)}`);
                }}
              >
                Delete
              </Button>
            ),
          },
        ]
      : []),
  ];
  return (
    <div ref={rootRef} tabIndex={-1} className="openings-table">
      <Table
        caption={`Openings of ${room.name}`}
        columns={columns}
        rows={openings}
        rowKey={(opening) => opening.id}
        narrow="scroll"
      />
    </div>
  );
}
