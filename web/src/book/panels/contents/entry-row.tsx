import type { Done, Refusal } from '@embertally/shared/survey/command';
import { deleteEntries } from '@embertally/shared/survey/commands/delete-entries';
import type { Entry } from '@embertally/shared/survey/survey-document';
import { displayUnit } from '@embertally/shared/units/display-unit';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { memo } from 'react';
import { Button } from '../../../components/button.tsx';
import { useUnits } from '../../../lib/units-context.ts';
import { withMass } from '../../plan/with-mass.ts';
import { useBookSession } from '../../session/use-book-session.ts';
import { EVIDENCE_WORDS, KEEPING_WORDS } from '../../tally/entry-words.ts';
import { useQuantity } from '../../../lib/use-quantity.ts';
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
  /** Its material has a newer approved value; taken above the table or in the strip. */
  readonly newerHeat: boolean;
  /** Position among all rows, heading included, where not all rows are in the page. */
  readonly rowIndex: number | undefined;
  readonly edit: EditEntry;
  readonly onOpen: (entryId: string) => void;
  /** Called before the row goes. */
  readonly onLeave: (entryId: string) => void;
}

/** One entry of the contents table. */
export const EntryRow = memo(function EntryRow(props: EntryRowProps) {
  const { entry, heat_MJ, canEdit, picked, newerHeat, rowIndex, edit, onOpen, onLeave } = props;
  const session = useBookSession();
  const units = useUnits();
  const show = useQuantity();
  const mass_kg = entryMass(entry);
  const name = (
    <>
      <button
        type="button"
        className="row-name"
        onClick={() => {
          session.select([{ kind: 'entry', id: entry.id }]);
        }}
      >
        {entry.label}
      </button>
      {newerHeat ? <span className="block text-small font-normal text-ochre">a newer value exists</span> : null}
    </>
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
      <tr role="row" className="entry-row" data-picked={picked ? 'yes' : undefined} aria-rowindex={rowIndex}>
        <th role="rowheader" scope="row">
          {name}
        </th>
        <td role="cell" data-label="Count" data-align="end">
          {entry.count}
        </td>
        <td role="cell" data-label="Mass of one" data-align="end">
          {formatQuantity(mass_kg, 'kg', units, { figures: 'as entered' }).text}
        </td>
        <td role="cell" data-label="Kept">
          {KEEPING_WORDS[entry.keeping]}
        </td>
        <td role="cell" data-label="How known">
          {EVIDENCE_WORDS[entry.evidence]}
        </td>
        <td role="cell" data-label={`Heat, ${displayUnit('MJ', units)?.symbol ?? 'MJ'}`} data-align="end">
          {heat}
        </td>
        <td role="cell">{more}</td>
      </tr>
    );
  }
  return (
    <tr role="row" className="entry-row" data-picked={picked ? 'yes' : undefined} aria-rowindex={rowIndex}>
      <th role="rowheader" scope="row">
        {name}
      </th>
      <td role="cell" data-label="Count">
        <CountField
          label={`Count of ${entry.label}`}
          labelUnseen
          compact
          value={entry.count}
          run={(count) => edit(entry, { count })}
        />
      </td>
      <td role="cell" data-label="Mass of one">
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
      <td role="cell" data-label="Kept">
        <CommandChoice
          label={`How ${entry.label} is kept`}
          labelUnseen
          compact
          value={entry.keeping}
          options={KEEPING}
          run={(keeping) => edit(entry, { keeping })}
        />
      </td>
      <td role="cell" data-label="How known">
        <CommandChoice
          label={`How ${entry.label} is known`}
          labelUnseen
          compact
          value={entry.evidence}
          options={EVIDENCE}
          run={(evidence) => edit(entry, { evidence })}
        />
      </td>
      <td role="cell" data-label={`Heat, ${displayUnit('MJ', units)?.symbol ?? 'MJ'}`} data-align="end">
        {heat}
      </td>
      <td role="cell">
        <span className="flex gap-x-3">
          {more}
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
