import type { BookPageName } from '../session/book-state.ts';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';

const PAGES: readonly { readonly page: BookPageName; readonly label: string }[] = [
  { page: 'plan', label: 'Plan' },
  { page: 'tally', label: 'Tally' },
  { page: 'rooms', label: 'Rooms' },
];

/** Turns between the three pages where only one has room. */
export function BookTabs() {
  const session = useBookSession();
  const page = useBook((state) => state.page);
  return (
    <nav className="book-tabs" aria-label="Pages of the Book">
      {PAGES.map(({ page: name, label }) => (
        <button
          key={name}
          type="button"
          aria-current={name === page ? 'page' : undefined}
          onClick={() => {
            session.turnTo(name);
          }}
        >
          {label}
        </button>
      ))}
    </nav>
  );
}
