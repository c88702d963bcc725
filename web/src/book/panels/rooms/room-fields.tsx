import { USES } from '@embertally/shared/catalogue/uses';
import { editRoom, type EditRoomInput } from '@embertally/shared/survey/commands/edit-room';
import { roomHeight } from '@embertally/shared/survey/derive/room-height';
import type { Room } from '@embertally/shared/survey/survey-document';
import { useBook } from '../../session/use-book.ts';
import { CommandChoice } from '../command-choice.tsx';
import { CommandQuantity } from '../command-quantity.tsx';
import { CommandText } from '../command-text.tsx';
import { FieldGroup } from '../field-group.tsx';
import { useRunBack } from '../run-back.ts';
import { AssumptionFields } from './assumption-fields.tsx';
import { LiningFields } from './lining-fields.tsx';
import { ProtectionFields } from './protection-fields.tsx';
import { liningWords, protectionWords, wordsOfUse } from './room-words.ts';

interface RoomFieldsProps {
  readonly room: Room;
  readonly canEdit: boolean;
}

/** The classes of EN 1991-1-2:2002, Table E.1. */
const DANGERS = [
  { value: '0.78', label: '0.78: slight' },
  { value: '1', label: '1.00: ordinary' },
  { value: '1.22', label: '1.22: moderate' },
  { value: '1.44', label: '1.44: high' },
  { value: '1.66', label: '1.66: very high' },
] as const;

/** What is known of one room, field by field; each is saved when it is left. */
export function RoomFields({ room, canEdit }: RoomFieldsProps) {
  const runBack = useRunBack();
  const inherited = useBook((state) => roomHeight(state.document, { ...room, height_m: null }));
  const run = (patch: EditRoomInput['patch'], label: string) =>
    runBack(editRoom, { room_id: room.id, patch }, `${label} of ${room.name}`);
  if (!canEdit) {
    return (
      <dl className="grid gap-1">
        {[
          ['Name', room.name],
          ['Use', wordsOfUse(room.use)],
          ['Linings', liningWords(room.lining)],
          ['Protection', protectionWords(room.protection)],
          ['Rated resistance', room.rating_min === null ? 'not recorded' : `${room.rating_min} min`],
          ['Notes', room.notes === '' ? '–' : room.notes],
        ].map(([name, text]) => (
          <div key={name} className="grid grid-cols-[10rem_minmax(0,1fr)] border-b border-rule py-1">
            <dt className="text-soft">{name}</dt>
            <dd>{text}</dd>
          </div>
        ))}
      </dl>
    );
  }
  const ownDanger =
    room.danger_of_activation !== null && !DANGERS.some(({ value }) => Number(value) === room.danger_of_activation);
  const ownUse = room.use !== null && !USES.some((use) => use.key === room.use);
  return (
    <div className="grid gap-6">
      <FieldGroup title="The room">
        <CommandText label="Name" value={room.name} run={(name) => run({ name }, 'Changed the name')} />
        <CommandChoice
          label="Used as"
          value={room.use ?? ''}
          options={[
            { value: '', label: 'Not recorded' },
            ...(ownUse ? [{ value: room.use ?? '', label: room.use ?? '' }] : []),
            ...USES.map((use) => ({ value: use.key, label: use.label })),
          ]}
          run={(use) => run({ use: use === '' ? null : use }, 'Changed the use')}
        />
        <CommandQuantity
          label="Clear height"
          hint={
            room.height_m === null
              ? 'The storey’s height, until another is given here.'
              : 'Emptied, the storey’s height holds.'
          }
          unit="m"
          value={room.height_m ?? inherited}
          optional
          minimum={0.5}
          maximum={100}
          run={(height_m) => run({ height_m }, 'Changed the height')}
        />
        <CommandQuantity
          label="Measured floor area"
          hint="Stands in place of the drawn area."
          unit="m2"
          value={room.measured_floor_area_m2}
          optional
          minimum={0.01}
          maximum={1_000_000}
          run={(measured_floor_area_m2) => run({ measured_floor_area_m2 }, 'Changed the measured area')}
        />
        <CommandQuantity
          label="Floor area of the fire compartment"
          hint="If the room is part of a larger one."
          unit="m2"
          value={room.compartment_floor_m2}
          optional
          minimum={0.01}
          maximum={1_000_000}
          run={(compartment_floor_m2) => run({ compartment_floor_m2 }, 'Changed the compartment')}
        />
      </FieldGroup>
      <FieldGroup title="Made of">
        <LiningFields lining={room.lining} run={(lining) => run({ lining }, 'Changed the linings')} />
      </FieldGroup>
      <FieldGroup title="Holds out and lets out">
        <CommandQuantity
          label="Rated fire resistance"
          unit="min"
          value={room.rating_min}
          optional
          minimum={0}
          maximum={480}
          run={(rating_min) => run({ rating_min }, 'Changed the rating')}
        />
        <CommandChoice
          label="Closed in by rated construction"
          value={
            room.bounded_by_rated_construction === null ? 'unknown' : room.bounded_by_rated_construction ? 'yes' : 'no'
          }
          options={[
            { value: 'unknown', label: 'Not known' },
            { value: 'yes', label: 'Yes' },
            { value: 'no', label: 'No' },
          ]}
          run={(answer) =>
            run(
              { bounded_by_rated_construction: answer === 'unknown' ? null : answer === 'yes' },
              'Changed the enclosure',
            )
          }
        />
        <CommandQuantity
          label="Area of roof vents"
          unit="m2"
          value={room.roof_vents_m2}
          minimum={0}
          maximum={100_000}
          run={(roof_vents_m2) => run({ roof_vents_m2 }, 'Changed the roof vents')}
        />
        <CommandChoice
          label="Roof vents"
          value={room.roof_vents_state}
          options={[
            { value: 'open', label: 'Stand open' },
            { value: 'fails', label: 'Fail at flashover' },
            { value: 'closed', label: 'Stay closed' },
          ]}
          run={(roof_vents_state) => run({ roof_vents_state }, 'Changed the roof vents')}
        />
        <CommandChoice
          label="Danger of activation"
          value={String(room.danger_of_activation ?? '')}
          options={[
            { value: '', label: 'As the use has it' },
            ...DANGERS,
            ...(ownDanger
              ? [{ value: String(room.danger_of_activation), label: String(room.danger_of_activation) }]
              : []),
          ]}
          run={(factor) =>
            run({ danger_of_activation: factor === '' ? null : Number(factor) }, 'Changed the danger of activation')
          }
        />
      </FieldGroup>
      <FieldGroup title="Protected by">
        <ProtectionFields
          protection={room.protection}
          run={(protection) => run({ protection }, 'Changed the protection')}
        />
      </FieldGroup>
      <FieldGroup title="Taken for the tally">
        <AssumptionFields room={room} run={(assumptions) => run({ assumptions }, 'Changed what the tally takes')} />
      </FieldGroup>
      <CommandText
        label="Notes"
        optional
        lines="several"
        value={room.notes}
        run={(notes) => run({ notes }, 'Changed the notes')}
      />
    </div>
  );
}
