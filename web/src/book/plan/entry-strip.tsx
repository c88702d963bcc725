import { editEntries } from '@embertally/shared/survey/commands/edit-entries';
import type { Entry } from '@embertally/shared/survey/survey-document';
import { duplicatePicked } from '../actions/copy-picked.ts';
import { deletePicked } from '../actions/delete-picked.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { KEEPING_CHOICES } from './keeping-choices.ts';
import { NewerHeatNotice } from './newer-heat-notice.tsx';
import { StripChoice } from './strip-choice.tsx';
import { StripField } from './strip-field.tsx';
import { StripQuantity } from './strip-quantity.tsx';
import { StripVerb } from './strip-verb.tsx';
import { readCount } from './read-count.ts';
import { withMass } from './with-mass.ts';

/** What is asked most of one entry: how many, how heavy, how large, how kept. All of it stands in the contents table. */
export function EntryStrip({ entry }: { readonly entry: Entry }) {
  const session = useBookSession();
  const edit = (patch: Parameters<typeof editEntries>[1]['patch'], label: string): string | null => {
    const result = session.run(editEntries, { entry_ids: [entry.id], patch }, label, { refusal: 'returned' });
    return result.refused ? result.message : null;
  };
  const massEach = entry.parts.reduce((sum, part) => sum + part.mass_kg, 0);
  return (
    <>
      <StripField
        label="Entry"
        wide
        value={entry.label}
        onCommit={(label) => edit({ label: label.trim() }, `Renamed ${entry.label}`)}
      />
      <StripField
        label="Count"
        value={String(entry.count)}
        onCommit={(typed) => {
          const read = readCount(typed);
          return read.ok ? edit({ count: read.value }, `Counted ${entry.label}: ${read.value}`) : read.message;
        }}
      />
      <StripQuantity
        label="Mass each"
        unit="kg"
        value={massEach}
        onCommit={(mass_kg) => edit({ parts: withMass(entry.parts, mass_kg) }, `Changed the mass of ${entry.label}`)}
      />
      <StripQuantity
        label="Width"
        unit="m"
        value={entry.width_m}
        onCommit={(width_m) => edit({ width_m }, `Resized ${entry.label}`)}
      />
      <StripQuantity
        label="Depth"
        unit="m"
        value={entry.depth_m}
        onCommit={(depth_m) => edit({ depth_m }, `Resized ${entry.label}`)}
      />
      <StripChoice
        label="Kept"
        value={entry.keeping}
        choices={KEEPING_CHOICES}
        onChoose={(keeping) => edit({ keeping }, `${entry.label} is kept ${keeping}`)}
      />
      <NewerHeatNotice entries={[entry]} canEdit />
      <StripVerb
        label="Duplicate"
        onPress={() => {
          duplicatePicked(session);
        }}
      />
      <StripVerb
        label="Delete"
        onPress={() => {
          deletePicked(session);
        }}
      />
    </>
  );
}
