import { duplicateEntries } from '@embertally/shared/survey/commands/duplicate-entries';
import { moveEntries } from '@embertally/shared/survey/commands/move-entries';
import type { Entry } from '@embertally/shared/survey/survey-document';
import { Button } from '../../../components/button.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { useBook } from '../../session/use-book.ts';
import { useBookSession } from '../../session/use-book-session.ts';
import { ENCLOSURE_WORDS, EVIDENCE_WORDS, KEEPING_WORDS } from '../../tally/entry-words.ts';
import { useQuantity } from '../../../lib/use-quantity.ts';
import { CommandChoice } from '../command-choice.tsx';
import { CommandQuantity } from '../command-quantity.tsx';
import { CommandText } from '../command-text.tsx';
import { FieldGroup } from '../field-group.tsx';
import { useRunBack } from '../run-back.ts';
import { ENCLOSURE, EVIDENCE, GROWTH, IGNITION, KEEPING } from './entry-choices.ts';
import type { EditEntry } from './entry-row.tsx';

const BESIDE_M = 0.2;

interface EntryDialogProps {
  readonly entry: Entry;
  readonly canEdit: boolean;
  readonly edit: EditEntry;
  readonly onClose: () => void;
}

/** Everything recorded of one entry; each field is saved when it is left. */
export function EntryDialog({ entry, canEdit, edit, onClose }: EntryDialogProps) {
  return (
    <Dialog open onClose={onClose} title={entry.label} width="wide">
      {canEdit ? <EntryFields entry={entry} edit={edit} /> : <EntryFacts entry={entry} />}
      <PartList entry={entry} />
      {canEdit && <DuplicateButton entry={entry} onDone={onClose} />}
      <p className="text-small text-soft">
        {entry.recorded_by === null
          ? 'Nobody is named as having recorded it.'
          : `Recorded by ${entry.recorded_by}${entry.recorded_at === null ? '' : `, ${day(entry.recorded_at)}`}.`}{' '}
        {entry.confirmed_by === null
          ? 'Not confirmed since.'
          : `Last confirmed by ${entry.confirmed_by}${entry.confirmed_at === null ? '' : `, ${day(entry.confirmed_at)}`}.`}
      </p>
    </Dialog>
  );
}

const day = (instant: string): string =>
  new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric' }).format(new Date(instant));

function EntryFields({ entry, edit }: { readonly entry: Entry; readonly edit: EditEntry }) {
  const runBack = useRunBack();
  const rooms = useBook((state) => state.document.rooms);
  const move = (patch: { readonly x_m?: number; readonly y_m?: number; readonly room_id?: string }) =>
    runBack(moveEntries, { moves: [{ entry_id: entry.id, ...patch }] }, `Moved ${entry.label}`);
  return (
    <>
      <FieldGroup title="What and how">
        <CommandText label="Label" value={entry.label} run={(label) => edit(entry, { label })} />
        <CommandChoice
          label="Kept"
          value={entry.keeping}
          options={KEEPING}
          run={(keeping) => edit(entry, { keeping })}
        />
        <CommandChoice
          label="How known"
          value={entry.evidence}
          options={EVIDENCE}
          run={(evidence) => edit(entry, { evidence })}
        />
        <CommandChoice
          label="Enclosed"
          value={entry.enclosure}
          options={ENCLOSURE}
          run={(enclosure) => edit(entry, { enclosure })}
        />
        {entry.enclosure === 'sealed' && (
          <CommandQuantity
            label="Rating of the container"
            hint="Without one, its contents are counted in full."
            unit="min"
            value={entry.sealed_rating_min}
            optional
            minimum={0.1}
            maximum={480}
            run={(sealed_rating_min) => edit(entry, { sealed_rating_min })}
          />
        )}
      </FieldGroup>
      <FieldGroup title="Where and how large">
        <CommandChoice
          label="Room"
          hint="In another room it gets a free place."
          value={entry.room_id}
          options={[...rooms.values()].map((room) => ({ value: room.id, label: room.name }))}
          run={(room_id) => move({ room_id })}
        />
        <CommandQuantity label="Middle, from the left (x)" unit="m" value={entry.x_m} run={(x_m) => move({ x_m })} />
        <CommandQuantity label="Middle, from the bottom (y)" unit="m" value={entry.y_m} run={(y_m) => move({ y_m })} />
        <CommandQuantity
          label="Width"
          unit="m"
          value={entry.width_m}
          minimum={0.01}
          maximum={1000}
          run={(width_m) => edit(entry, { width_m })}
        />
        <CommandQuantity
          label="Depth"
          unit="m"
          value={entry.depth_m}
          minimum={0.01}
          maximum={1000}
          run={(depth_m) => edit(entry, { depth_m })}
        />
        <CommandQuantity
          label="Stack height"
          unit="m"
          value={entry.height_m}
          minimum={0.01}
          maximum={100}
          run={(height_m) => edit(entry, { height_m })}
        />
        <CommandQuantity
          label="Height above the floor"
          unit="m"
          value={entry.base_height_m}
          minimum={0}
          maximum={100}
          run={(base_height_m) => edit(entry, { base_height_m })}
        />
        <CommandText
          label="Turned (degrees)"
          width="short"
          value={String(entry.rotation_deg)}
          run={(typed) => {
            const rotation_deg = Number(typed.trim().replace(',', '.').replace(/°$/, ''));
            return Number.isFinite(rotation_deg) && typed.trim() !== ''
              ? edit(entry, { rotation_deg })
              : {
                  refused: true,
                  code: 'ROTATION_NOT_A_NUMBER',
                  message: 'Turned must be a number of degrees, like 45',
                };
          }}
        />
      </FieldGroup>
      <FieldGroup title="How it burns">
        <CommandChoice
          label="Growth"
          value={entry.growth ?? ''}
          options={GROWTH}
          run={(growth) => edit(entry, { growth: growth === '' ? null : growth })}
        />
        <CommandQuantity
          label="Peak of all pieces"
          unit="kW"
          value={entry.peak_kW}
          optional
          minimum={0.001}
          maximum={1_000_000}
          run={(peak_kW) => edit(entry, { peak_kW })}
        />
        <CommandChoice
          label="Takes fire"
          value={entry.ignition_class ?? ''}
          options={IGNITION}
          run={(ignition) => edit(entry, { ignition_class: ignition === '' ? null : ignition })}
        />
      </FieldGroup>
      <CommandText label="Note" optional lines="several" value={entry.note} run={(note) => edit(entry, { note })} />
    </>
  );
}

/** A copy stands a little beside its original; against a wall, on the spot. */
function DuplicateButton({ entry, onDone }: { readonly entry: Entry; readonly onDone: () => void }) {
  const session = useBookSession();
  const runBack = useRunBack();
  return (
    <Button
      className="justify-self-start self-start"
      onClick={() => {
        const copyAt = (by_m: number) => ({
          copies: [{ entry_id: entry.id, id: session.newId(), dx_m: by_m, dy_m: by_m }],
          recorded_by: session.person,
          recorded_at: session.now(),
        });
        const label = `Duplicated ${entry.label}`;
        if (runBack(duplicateEntries, copyAt(BESIDE_M), label).refused) runBack(duplicateEntries, copyAt(0), label);
        onDone();
      }}
    >
      Duplicate
    </Button>
  );
}

function EntryFacts({ entry }: { readonly entry: Entry }) {
  const show = useQuantity();
  const metres = (value: number): string => {
    const { text, unit } = show(value, 'm');
    return `${text} ${unit}`;
  };
  const facts: readonly (readonly [string, string])[] = [
    ['Kept', KEEPING_WORDS[entry.keeping]],
    ['How known', EVIDENCE_WORDS[entry.evidence]],
    ['Enclosed', ENCLOSURE_WORDS[entry.enclosure]],
    ['Size', `${metres(entry.width_m)} × ${metres(entry.depth_m)} × ${metres(entry.height_m)} high`],
    ['Note', entry.note === '' ? '–' : entry.note],
  ];
  return (
    <dl>
      {facts.map(([name, text]) => (
        <div key={name} className="grid grid-cols-[8rem_minmax(0,1fr)] border-b border-rule py-1">
          <dt className="text-soft">{name}</dt>
          <dd>{text}</dd>
        </div>
      ))}
    </dl>
  );
}

function PartList({ entry }: { readonly entry: Entry }) {
  const show = useQuantity();
  return (
    <section>
      <h2 className="border-b border-ink pb-1 font-bold">Made of</h2>
      <ul className="text-small">
        {entry.parts.map((part, index) => {
          const heat = show(part.net_heat_MJ_kg, 'MJ/kg');
          const mass = show(part.mass_kg, 'kg');
          return (
            <li key={`${String(index)} ${part.label}`} className="border-b border-rule py-1">
              {part.label}: <span className="figure">{mass.text}</span> {mass.unit} at{' '}
              <span className="figure">{heat.text}</span> {heat.unit}
              <span className="block text-soft">{part.heat_source}</span>
            </li>
          );
        })}
      </ul>
    </section>
  );
}
