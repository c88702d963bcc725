import type { Done, Refusal } from '@embertally/shared/survey/command';
import { deleteEntries } from '@embertally/shared/survey/commands/delete-entries';
import { duplicateEntries } from '@embertally/shared/survey/commands/duplicate-entries';
import type { Entry } from '@embertally/shared/survey/survey-document';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { memo } from 'react';
import { Button } from '../../../components/button.tsx';
import { useUnits } from '../../../lib/units-context.ts';
import { withMass } from '../../plan/with-mass.ts';
import { useBookSession } from '../../session/use-book-session.ts';
import { EVIDENCE_WORDS, KEEPING_WORDS } from '../../tally/entry-words.ts';
import { useQuantity } from '../../tally/use-quantity.ts';
import { CommandChoice } from '../command-choice.tsx';
import { CommandQuantity } from '../command-quantity.tsx';
import { CountField } from './count-field.tsx';
import { EVIDENCE, KEEPING } from './entry-choices.ts';
import { entryMass } from './entry-mass.ts';

export type EditEntry = (entry: Entry, patch: Partial<Omit<Entry, 'id' | 'room_id'>>) => Done | Refusal;

interface EntryRowProps {
  readonly entry: Entry;
  readonly heat_MJ: number | null;
  readonly canEdit: boolean;
  readonly picked: boolean;
  /** Position among all rows, heading included, where not all rows are in the page. */
  readonly rowIndex: number | undefined;
  readonly edit: EditEntry;
  readonly onOpen: (entryId: string) => void;
  /** Called before the row goes. */
  readonly onLeave: (entryId: string) => void;
}

/** A copy stands a little beside its original. */
const BESIDE_M = 0.2;

/** One entry of the contents table. */
export const EntryRow = memo(function EntryRow(props: EntryRowProps) {
  const { entry, heat_MJ, canEdit, picked, rowIndex, edit, onOpen, onLeave } = props;
  const session = useBookSession();
  const units = useUnits();
  const show = useQuantity();
  const mass_kg = entryMass(entry);
  const name = (
    <button
      type="button"
      className="row-name"
      onClick={() => {
        session.select([{ kind: 'entry', id: entry.id }]);
      }}
    >
      {entry.label}
    </button>
  );
  const heat = heat_MJ === null ? '–' : show(heat_MJ, 'MJ').text;
  const more = (
    <Button
      look="quiet"
      size="small"
      data-row-action={entry.id}
      aria-label={`${canEdit ? 'More' : 'All'} of ${entry.label}`}
      onClick={() => {
        onOpen(entry.id);
      }}
    >
      {canEdit ? 'More' : 'All of it'}
    </Button>
  );
  if (!canEdit) {
    return (
      <tr className="entry-row" data-picked={picked ? 'yes' : undefined} aria-rowindex={rowIndex}>
        <th scope="row">{name}</th>
        <td data-align="end">{entry.count}</td>
        <td data-align="end">{formatQuantity(mass_kg, 'kg', units, { figures: 'as entered' }).text}</td>
        <td>{KEEPING_WORDS[entry.keeping]}</td>
        <td>{EVIDENCE_WORDS[entry.evidence]}</td>
        <td data-align="end">{heat}</td>
        <td>{more}</td>
      </tr>
    );
  }
  return (
    <tr className="entry-row" data-picked={picked ? 'yes' : undefined} aria-rowindex={rowIndex}>
      <th scope="row">{name}</th>
      <td>
        <CountField
          label={`Count of ${entry.label}`}
          labelUnseen
          compact
          value={entry.count}
          run={(count) => edit(entry, { count })}
        />
      </td>
      <td>
        <CommandQuantity
          label={`Mass of one ${entry.label}`}
          labelUnseen
          compact
          unit="kg"
          value={mass_kg}
          minimum={0}
          maximum={1_000_000}
          run={(mass) => edit(entry, { parts: withMass(entry.parts, mass) })}
        />
      </td>
      <td>
        <CommandChoice
          label={`How ${entry.label} is kept`}
          labelUnseen
          compact
          value={entry.keeping}
          options={KEEPING}
          run={(keeping) => edit(entry, { keeping })}
        />
      </td>
      <td>
        <CommandChoice
          label={`How ${entry.label} is known`}
          labelUnseen
          compact
          value={entry.evidence}
          options={EVIDENCE}
          run={(evidence) => edit(entry, { evidence })}
        />
      </td>
      <td data-align="end">{heat}</td>
      <td>
        <span className="flex flex-wrap gap-x-3">
          {more}
          <Button
            look="quiet"
            size="small"
            aria-label={`Duplicate ${entry.label}`}
            onClick={() => {
              const copy = { entry_id: entry.id, id: session.newId(), dx_m: BESIDE_M, dy_m: BESIDE_M };
              const input = { copies: [copy], recorded_by: session.person, recorded_at: session.now() };
              const result = session.run(duplicateEntries, input, `Duplicated ${entry.label}`, { refusal: 'returned' });
              // Against a wall there is no place to the upper right; on the spot there always is.
              if (result.refused) {
                const onTheSpot = { ...copy, dx_m: 0, dy_m: 0 };
                session.run(duplicateEntries, { ...input, copies: [onTheSpot] }, `Duplicated ${entry.label}`);
              }
            }}
          >
            Duplicate
          </Button>
          <Button
            look="quiet"
            size="small"
            aria-label={`Delete ${entry.label}`}
            onClick={() => {
              onLeave(entry.id);
              session.run(deleteEntries, { entry_ids: [entry.id] }, `Deleted ${entry.label}`);
            }}
          >
            Delete
          </Button>
        </span>
      </td>
    </tr>
  );
});
