import { takeNewerHeat } from '@embertally/shared/survey/commands/take-newer-heat';
import type { Entry } from '@embertally/shared/survey/survey-document';
import { useQuantity } from '../../lib/use-quantity.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { useNewerHeats } from '../session/use-newer-heats.ts';

interface NewerHeatNoticeProps {
  readonly entries: readonly Entry[];
  readonly canEdit: boolean;
}

/** Says which entries hold a heat of which a newer version is approved, and takes the newer one: all of them in one step. */
export function NewerHeatNotice({ entries, canEdit }: NewerHeatNoticeProps) {
  const session = useBookSession();
  const newer = useNewerHeats();
  const show = useQuantity();
  const behind = entries.flatMap((entry) => {
    const [first] = newer.of(entry);
    return first === undefined ? [] : [{ entry, ...first }];
  });
  const [first] = behind;
  if (first === undefined) return null;
  const { text, unit } = show(first.newer.net_heat_MJ_kg, 'MJ/kg');
  const before = show(first.now.net_heat_MJ_kg, 'MJ/kg').text;
  return (
    <div className="newer-heat">
      <p>
        {behind.length === 1
          ? `A newer value exists${entries.length === 1 ? '' : ` for ${first.entry.label}`}: ${text} instead of ${before} ${unit}`
          : `Newer values exist for ${behind.length} entries, as ${text} instead of ${before} ${unit} for ${first.entry.label}`}
      </p>
      {canEdit ? (
        <button
          type="button"
          className="strip-verb"
          onClick={(event) => {
            // The notice goes with its reason; the focus stays where it stood.
            event.currentTarget.parentElement?.closest<HTMLElement>('[tabindex]')?.focus();
            session.run(
              takeNewerHeat,
              { entry_ids: behind.map(({ entry }) => entry.id), newer: [...newer.inForce.values()] },
              behind.length === 1
                ? `Took the newer heat of ${first.entry.label}`
                : `Took newer heats for ${behind.length} entries`,
            );
          }}
        >
          {behind.length === 1 ? 'Take it' : 'Take them all'}
        </button>
      ) : null}
    </div>
  );
}
