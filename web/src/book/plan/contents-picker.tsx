import { Combobox } from '../../components/combobox.tsx';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { catalogueItem } from './catalogue-item.ts';
import { catalogueTools } from './catalogue-tools.ts';

interface ContentsPickerProps {
  /** What is typed: kept outside, because a person types before the catalogue has arrived. */
  readonly typed: string;
  readonly onType: (typed: string) => void;
  readonly onPicked: () => void;
}

/** Which kind or material the next press places: type two letters, choose, press on the plan. */
export function ContentsPicker({ typed, onType, onPicked }: ContentsPickerProps) {
  const session = useBookSession();
  const placing = useBook((state) => state.placing.entry);
  const own = useBook((state) => state.ownMaterials);
  const hits = catalogueTools.search(typed, own);
  return (
    <div className="contents-picker">
      <Combobox
        label="Kind or material"
        autoFocus
        value={typed}
        onChange={onType}
        items={hits.map(catalogueItem)}
        nothing={typed === '' ? 'Type two letters: pa, cotton, chair' : 'Nothing in the catalogue answers to that.'}
        onPick={(item) => {
          const hit = hits.find((candidate) => catalogueItem(candidate).id === item.id);
          if (hit === undefined) return;
          session.setTool('contents', { entry: catalogueTools.entryOf(hit) });
          onType(hit.row.label);
          onPicked();
        }}
      />
      <p className="text-small text-soft">
        {placing === null ? 'Then press on the plan.' : `Press on the plan to place ${placing.label}; [ and ] turn it.`}
      </p>
    </div>
  );
}
