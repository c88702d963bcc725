import { useEffect, useRef, type RefObject } from 'react';
import { fitView } from '../actions/fit-view.ts';
import type { BookSession } from '../session/book-session.ts';

/** Narrower than this a whole storey would be too small to read. */
const NARROW_PX = 600;

/** Tells the session how large the plan's view is; the first time, shows the storey in it, or the room in hand. */
export function usePlanSize(element: RefObject<HTMLElement | null>, session: BookSession): void {
  const fittedFor = useRef<string | null>(null);
  useEffect(() => {
    const watched = element.current;
    if (watched === null) return;
    const fitOnce = () => {
      const { storeyId, view } = session.state;
      if (view.width === 0 || fittedFor.current === storeyId) return;
      fittedFor.current = storeyId;
      fitView(session, view.width < NARROW_PX ? 'room' : 'storey');
    };
    const measure = () => {
      session.setView(watched.clientWidth, watched.clientHeight);
      fitOnce();
    };
    const observer = new ResizeObserver(measure);
    observer.observe(watched);
    measure();
    const unsubscribe = session.subscribe(fitOnce);
    return () => {
      observer.disconnect();
      unsubscribe();
    };
  }, [element, session]);
}
