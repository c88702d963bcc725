import { OPENING_STARTS } from '@embertally/shared/survey/new-opening';
import type { Opening } from '@embertally/shared/survey/survey-document';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';

const WORDS: Readonly<Record<Opening['kind'], string>> = {
  door: 'Door',
  window: 'Window',
  vent: 'Vent',
  shutter: 'Shutter',
  gap: 'Gap',
};

/** Which kind of opening the next press puts in. */
export function OpeningKinds() {
  const session = useBookSession();
  const chosen = useBook((state) => state.placing.openingKind);
  return (
    <fieldset className="kind-row">
      <legend className="unseen">Kind of opening</legend>
      {(Object.keys(OPENING_STARTS) as Opening['kind'][]).map((kind) => (
        <label key={kind} className="kind-choice">
          <input
            type="radio"
            name="opening-kind"
            checked={kind === chosen}
            onChange={() => {
              session.setTool('opening', { openingKind: kind });
            }}
          />
          <span>{WORDS[kind]}</span>
        </label>
      ))}
    </fieldset>
  );
}
