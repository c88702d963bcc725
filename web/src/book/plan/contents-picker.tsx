import { useState } from 'react';
import { Combobox } from '../../components/combobox.tsx';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { catalogueTools } from './catalogue-tools.ts';

/** Which kind or material the next press places: type two letters, choose, press on the plan. */
export function ContentsPicker({ onPicked }: { readonly onPicked: () => void }) {
  const session = useBookSession();
  const placing = useBook((state) => state.placing.entry);
  const [typed, setTyped] = useState('');
  const hits = catalogueTools.search(typed);
  return (
    <div className="contents-picker">
      <Combobox
        label="Kind or material"
        labelUnseen
        autoFocus
        value={typed}
        onChange={setTyped}
        items={hits.map((hit) => ({ id: `${hit.type} ${hit.row.key}`, label: hit.row.label, detail: hit.row.group }))}
        nothing={typed === '' ? 'Type two letters: pa, cotton, chair' : 'Nothing in the catalogue answers to that.'}
        onPick={(item) => {
          const hit = hits.find((candidate) => `${candidate.type} ${candidate.row.key}` === item.id);
          if (hit === undefined) return;
          session.setTool('contents', { entry: catalogueTools.entryOf(hit) });
          setTyped(hit.row.label);
          onPicked();
        }}
      />
      <p className="text-small text-soft">
        {placing === null ? 'Then press on the plan.' : `Press on the plan to place ${placing.label}; [ and ] turn it.`}
      </p>
    </div>
  );
}
