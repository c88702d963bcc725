import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';

/** Which storey lies open, and the way to the others: the browser's own list, highest storey first. */
export function StoreyPicker() {
  const session = useBookSession();
  const storeys = useBook((state) => state.document.storeys);
  const storeyId = useBook((state) => state.storeyId);
  const byLevel = [...storeys.values()].sort((a, b) => b.level_m - a.level_m);
  if (storeyId === null) return <span>No storey</span>;
  return (
    <select
      className="storey-picker"
      aria-label="Storey"
      value={storeyId}
      onChange={(event) => {
        session.goToStorey(event.target.value);
      }}
    >
      {byLevel.map((storey) => (
        <option key={storey.id} value={storey.id}>
          {storey.name}
        </option>
      ))}
    </select>
  );
}
