import { useEffect, useRef, type RefObject } from 'react';
import { fitView } from '../actions/fit-view.ts';
import type { BookSession } from '../session/book-session.ts';
import type { Camera } from '../session/book-state.ts';

/**
 * Tells the session how large the plan's view is, and shows a storey whole when it is first seen. Until the person has
 * moved the plan it stays whole: pages beside it arrive later, and tablets are turned.
 */
export function usePlanSize(element: RefObject<HTMLElement | null>, session: BookSession): void {
  const fitted = useRef<{ readonly storeyId: string | null; readonly camera: Camera } | null>(null);
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
    const measure = () => {
      const untouched = fitted.current?.camera === session.state.camera;
      session.setView(watched.clientWidth, watched.clientHeight);
      if (untouched) fit();
      else fitNewStorey();
    };
    const observer = new ResizeObserver(measure);
    observer.observe(watched);
    measure();
    const unsubscribe = session.subscribe(fitNewStorey);
    return () => {
      observer.disconnect();
      unsubscribe();
    };
  }, [element, session]);
}
