import { Menu, MenuItem } from '../../components/menu.tsx';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';

/** Which storey lies open, and the way to the others. */
export function StoreyPicker() {
  const session = useBookSession();
  const storeys = useBook((state) => state.document.storeys);
  const storeyId = useBook((state) => state.storeyId);
  const current = storeys.get(storeyId ?? '');
  const byLevel = [...storeys.values()].sort((a, b) => b.level_m - a.level_m);
  return (
    <Menu
      button={<span className="font-bold text-ink">{current?.name ?? 'No storey'} ▾</span>}
      label={`Storey: ${current?.name ?? 'none'}`}
    >
      {byLevel.map((storey) => (
        <MenuItem
          key={storey.id}
          onChoose={() => {
            session.goToStorey(storey.id);
          }}
        >
          {storey.name}
        </MenuItem>
      ))}
    </Menu>
  );
}
