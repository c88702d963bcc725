import type { Entry, Room } from '@embertally/shared/survey/survey-document';
import type { SpreadTally } from '@embertally/shared/tally/room-tally';
import { useMemo } from 'react';
import { SelectField } from '../../../components/select-field.tsx';

interface FirstEntryProps {
  readonly spread: SpreadTally;
  readonly room: Room;
  readonly entries: ReadonlyMap<string, Entry>;
  /** Null: the worst one. */
  readonly chosen: string | null;
  readonly onChoose: (entryId: string | null) => void;
}

const WORST = '';

/** What burns first: the entry with the worst fire, or one that is chosen. */
export function FirstEntry({ spread, room, entries, chosen, onChoose }: FirstEntryProps) {
  const options = useMemo(() => {
    const here = [...entries.values()].filter((entry) => entry.room_id === room.id);
    return here
      .map((entry) => ({ value: entry.id, label: entry.label }))
      .sort((a, b) => a.label.localeCompare(b.label));
  }, [entries, room.id]);
  const worst = spread.firstChosen === 'worst' ? entries.get(spread.first ?? '')?.label : undefined;
  return (
    <SelectField
      label="What burns first"
      width="medium"
      value={chosen ?? WORST}
      options={[
        { value: WORST, label: worst === undefined ? 'The worst of all' : `The worst of all: ${worst}` },
        ...options,
      ]}
      onChange={(value) => {
        onChoose(value === WORST ? null : value);
      }}
    />
  );
}
