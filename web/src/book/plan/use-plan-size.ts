import { useEffect, useRef, type RefObject } from 'react';
import { fitView } from '../actions/fit-view.ts';
import type { BookSession } from '../session/book-session.ts';
import type { Camera } from '../session/book-state.ts';

/**
 * Tells the session how large the plan's view is, and shows a storey whole when it is first seen. Until the person has
 * moved the plan or pressed on it, it stays whole when the width changes: pages beside it arrive later, and tablets are
 * turned. Once somebody works on it, it never moves under their hand.
 */
export function usePlanSize(element: RefObject<HTMLElement | null>, session: BookSession): void {
  const fitted = useRef<{ readonly storeyId: string | null; readonly camera: Camera } | null>(null);
  const inUse = useRef(false);
  useEffect(() => {
    const watched = element.current;
    if (watched === null) return;
    const fit = () => {
      const { storeyId, view } = session.state;
      if (view.width === 0) return;
      // Known as fitted before the camera moves: the move itself is heard below.
      fitted.current = { storeyId, camera: session.state.camera };
      fitView(session, 'storey');
      fitted.current = { storeyId, camera: session.state.camera };
    };
    const fitNewStorey = () => {
      if (fitted.current?.storeyId !== session.state.storeyId) fit();
    };
    const begun = () => {
      inUse.current = true;
    };
    const measure = () => {
      const turned = watched.clientWidth !== session.state.view.width;
      const untouched = !inUse.current && turned && fitted.current?.camera === session.state.camera;
      session.setView(watched.clientWidth, watched.clientHeight);
      if (untouched) fit();
      else fitNewStorey();
    };
    const observer = new ResizeObserver(measure);
    observer.observe(watched);
    watched.addEventListener('pointerdown', begun);
    measure();
    const unsubscribe = session.subscribe(fitNewStorey);
    return () => {
      observer.disconnect();
      watched.removeEventListener('pointerdown', begun);
      unsubscribe();
    };
  }, [element, session]);
}
