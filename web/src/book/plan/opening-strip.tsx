import { editOpening } from '@embertally/shared/survey/commands/edit-opening';
import type { Opening, OpeningState } from '@embertally/shared/survey/survey-document';
import { deletePicked } from '../actions/delete-picked.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { StripChoice } from './strip-choice.tsx';
import { StripQuantity } from './strip-quantity.tsx';
import { StripVerb } from './strip-verb.tsx';

const STATES: readonly { value: OpeningState; label: string }[] = [
  { value: 'open', label: 'open' },
  { value: 'closed', label: 'closed' },
  { value: 'fails', label: 'fails at flashover' },
];

/** The sizes of one opening and how it stands. */
export function OpeningStrip({ opening }: { readonly opening: Opening }) {
  const session = useBookSession();
  const edit = (patch: Parameters<typeof editOpening>[1]['patch']): string | null => {
    const result = session.run(editOpening, { opening_id: opening.id, patch }, `Changed a ${opening.kind}`, {
      refusal: 'returned',
    });
    return result.refused ? result.message : null;
  };
  return (
    <>
      <p className="strip-name">{opening.label === '' ? opening.kind : opening.label}</p>
      <StripQuantity label="Width" unit="m" value={opening.width_m} onCommit={(width_m) => edit({ width_m })} />
      <StripQuantity label="Height" unit="m" value={opening.height_m} onCommit={(height_m) => edit({ height_m })} />
      <StripQuantity label="Sill" unit="m" value={opening.sill_m} onCommit={(sill_m) => edit({ sill_m })} />
      <StripQuantity
        label="From corner"
        unit="m"
        value={opening.offset_m}
        onCommit={(offset_m) => edit({ offset_m })}
      />
      <StripChoice label="Stands" value={opening.state} choices={STATES} onChoose={(state) => edit({ state })} />
      <StripVerb
        label="Delete"
        onPress={() => {
          deletePicked(session);
        }}
      />
    </>
  );
}
