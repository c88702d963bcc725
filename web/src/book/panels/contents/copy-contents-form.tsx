import { copyContents } from '@embertally/shared/survey/commands/copy-contents';
import { entriesOfRoom } from '@embertally/shared/survey/derive/entries-of-room';
import type { Room } from '@embertally/shared/survey/survey-document';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { SelectField } from '../../../components/select-field.tsx';
import { useBook } from '../../session/use-book.ts';
import { useBookSession } from '../../session/use-book-session.ts';
import { useRunBack } from '../run-back.ts';

/** Records what stands in another room in this one as well. */
export function CopyContentsForm({ room }: { readonly room: Room }) {
  const session = useBookSession();
  const runBack = useRunBack();
  const document = useBook((state) => state.document);
  const sources = [...document.rooms.values()].filter(
    (other) => other.id !== room.id && entriesOfRoom(document, other.id).length > 0,
  );
  const [from, setFrom] = useState(sources[0]?.id ?? '');
  const [error, setError] = useState<string | undefined>(undefined);
  const source = sources.find((other) => other.id === from) ?? sources[0];
  if (source === undefined) return <p className="text-soft">No other room has contents yet.</p>;
  return (
    <form
      className="flex flex-wrap items-end gap-4"
      aria-label="Copy contents"
      onSubmit={(event) => {
        event.preventDefault();
        const ids = Object.fromEntries(entriesOfRoom(document, source.id).map((entry) => [entry.id, session.newId()]));
        const result = runBack(
          copyContents,
          {
            from_room_id: source.id,
            to_room_id: room.id,
            ids,
            recorded_by: session.person,
            recorded_at: session.now(),
          },
          `Copied the contents of ${source.name} to ${room.name}`,
        );
        setError(result.refused ? result.message : undefined);
      }}
    >
      <SelectField
        label="From"
        value={source.id}
        error={error}
        options={sources.map((other) => ({
          value: other.id,
          label: `${other.name}, ${entriesOfRoom(document, other.id).length} entries`,
        }))}
        onChange={setFrom}
        width="medium"
      />
      <Button type="submit">Copy to {room.name}</Button>
    </form>
  );
}
