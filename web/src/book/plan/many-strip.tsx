import { editEntries } from '@embertally/shared/survey/commands/edit-entries';
import type { Keeping } from '@embertally/shared/survey/survey-document';
import { duplicatePicked } from '../actions/copy-picked.ts';
import { deletePicked } from '../actions/delete-picked.ts';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { KEEPING_CHOICES } from './keeping-choices.ts';
import { NewerHeatNotice } from './newer-heat-notice.tsx';
import { StripChoice } from './strip-choice.tsx';
import { StripVerb } from './strip-verb.tsx';

const MIXED = { value: 'mixed' as const, label: 'mixed' };

/** What several picked entries have in common. */
export function ManyStrip({ ids }: { readonly ids: readonly string[] }) {
  const session = useBookSession();
  const keeping = useBook((state): Keeping | 'mixed' => {
    const [first, ...others] = ids.map((id) => state.document.entries.get(id)?.keeping);
    return first === undefined || others.some((other) => other !== first) ? 'mixed' : first;
  });
  const document = useBook((state) => state.document);
  const entries = ids.flatMap((id) => document.entries.get(id) ?? []);
  return (
    <>
      <p className="strip-name">{ids.length} entries</p>
      <StripChoice
        label="Kept"
        value={keeping}
        choices={keeping === 'mixed' ? [MIXED, ...KEEPING_CHOICES] : KEEPING_CHOICES}
        onChoose={(chosen) => {
          if (chosen !== 'mixed')
            session.run(
              editEntries,
              { entry_ids: ids, patch: { keeping: chosen } },
              `${ids.length} entries are kept ${chosen}`,
            );
        }}
      />
      <NewerHeatNotice entries={entries} canEdit />
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
