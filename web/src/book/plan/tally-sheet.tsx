import { useId, useState, type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '../../lib/paths.ts';
import { useBook } from '../session/use-book.ts';

/** The right page. Where there is no room for two pages it is a sheet pulled up from below. */
export function TallySheet({ children }: { readonly children: ReactNode }) {
  const body = useId();
  const [open, setOpen] = useState(false);
  const room = useBook((state) => state.document.rooms.get(state.roomInHand ?? '')?.name);
  return (
    <section className="book-tally" aria-label="Tally" data-open={open ? 'yes' : 'no'}>
      <button
        type="button"
        className="sheet-pull"
        aria-expanded={open}
        aria-controls={body}
        onClick={() => {
          setOpen(!open);
        }}
      >
        <span className="sheet-grip" aria-hidden="true" />
        {open ? 'Put the tally away' : `Tally of ${room ?? 'a room'}`}
      </button>
      <div id={body} className="book-tally-body">
        <div className="book-page-body">{children}</div>
      </div>
      <p className="tally-foot">
        Planning estimate from published methods. It does not replace the local fire code, the authority having
        jurisdiction or licensed practice. <Link to={paths.cautions()}>Cautions</Link>
      </p>
    </section>
  );
}
