import { useEffect, useId, useRef, type PointerEvent as ReactPointerEvent, type ReactNode } from 'react';
import { PlanStage } from '../canvas/plan-stage.tsx';
import type { HostPointer, PlanHost } from '../interaction/plan-host.ts';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { usePlanSize } from './use-plan-size.ts';

const WHEEL_STEP = 0.0016;

/** The plan one can touch: turns the browser's events into facts for the host. What is on it is also in the tables. */
export function PlanSurface({ host, children }: { readonly host: PlanHost; readonly children?: ReactNode }) {
  const session = useBookSession();
  const surface = useRef<HTMLDivElement>(null);
  const spaceHeld = useRef(false);
  const described = useId();
  const storeyName = useBook((state) => state.document.storeys.get(state.storeyId ?? '')?.name ?? 'the building');
  const tool = useBook((state) => state.tool);
  usePlanSize(surface, session);

  useEffect(() => {
    const element = surface.current;
    if (element === null) return;
    // React listens to the wheel passively; the page must not scroll while the plan zooms.
    const wheel = (event: WheelEvent) => {
      event.preventDefault();
      const box = element.getBoundingClientRect();
      const at = { x: event.clientX - box.left, y: event.clientY - box.top };
      const lines = event.deltaMode === WheelEvent.DOM_DELTA_LINE ? 16 : 1;
      if (event.shiftKey) host.panBy(-event.deltaY * lines, 0);
      else host.zoomAt(at, Math.exp(-event.deltaY * lines * WHEEL_STEP * (event.ctrlKey ? 4 : 1)));
    };
    const lose = () => {
      host.lose();
    };
    // A second finger beside the plan, on a strip or a verb, calls off what the first one began as well.
    const second = (event: PointerEvent) => {
      const beside = !(event.target instanceof Node && element.contains(event.target));
      if (event.pointerType === 'touch' && !event.isPrimary && beside) host.lose();
    };
    element.addEventListener('wheel', wheel, { passive: false });
    window.addEventListener('pointerdown', second, true);
    window.addEventListener('blur', lose);
    return () => {
      element.removeEventListener('wheel', wheel);
      window.removeEventListener('pointerdown', second, true);
      window.removeEventListener('blur', lose);
    };
  }, [host]);

  const fact = (event: ReactPointerEvent<HTMLDivElement>): HostPointer => {
    const box = event.currentTarget.getBoundingClientRect();
    return {
      id: event.pointerId,
      type: event.pointerType === 'touch' ? 'touch' : event.pointerType === 'pen' ? 'pen' : 'mouse',
      at: { x: event.clientX - box.left, y: event.clientY - box.top },
      primary: event.isPrimary,
      shift: event.shiftKey,
      free: event.altKey || event.ctrlKey,
      pans: event.button === 1 || spaceHeld.current,
    };
  };

  return (
    <div className="plan-surface" data-tool={tool}>
      <div
        ref={surface}
        className="plan-canvas"
        role="application"
        aria-roledescription="plan"
        aria-label={`Plan of ${storeyName}`}
        aria-describedby={described}
        tabIndex={0}
        onPointerDown={(event) => {
          if (event.button > 1) return;
          event.currentTarget.setPointerCapture(event.pointerId);
          host.press(fact(event));
        }}
        onPointerMove={(event) => {
          host.move(fact(event));
        }}
        onPointerUp={(event) => {
          host.lift(fact(event));
        }}
        onPointerCancel={() => {
          host.lose();
        }}
        onPointerLeave={() => {
          host.leave();
        }}
        onKeyDown={(event) => {
          if (event.key === ' ' && !event.repeat && host.crosshair.get() === null) spaceHeld.current = true;
          if (event.ctrlKey || event.metaKey) return;
          if (!host.key({ key: event.key, shift: event.shiftKey, alt: event.altKey })) return;
          event.preventDefault();
          event.stopPropagation();
        }}
        onKeyUp={(event) => {
          if (event.key === ' ') spaceHeld.current = false;
        }}
        onBlur={() => {
          spaceHeld.current = false;
        }}
      >
        <PlanStage host={host} />
      </div>
      <p id={described} className="unseen">
        Arrow keys move what is picked, or point while a tool is in hand; Enter presses there, Escape ends. Everything
        on the plan is also in the tables of rooms, openings and contents. Press the question mark for all keys.
      </p>
      {children}
    </div>
  );
}
