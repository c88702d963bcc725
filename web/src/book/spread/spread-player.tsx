import { useEffect, useRef } from 'react';
import { Button } from '../../components/button.tsx';
import { useQuantity } from '../../lib/use-quantity.ts';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { useRoomInput } from '../session/use-room-input.ts';
import { FirePlayer } from './fire-player.tsx';
import { GapNote } from './gap-note.tsx';
import { usePlayer, useSpreadPlay } from './use-spread-play.ts';
import './spread.css';

/** Stands at the foot of the plan while a fire or a gap is shown on it. What is shown goes when its room changes. */
export function SpreadPlayer() {
  const session = useBookSession();
  const player = usePlayer();
  const show = useQuantity();
  const fire = useSpreadPlay((state) => state.fire);
  const gap = useSpreadPlay((state) => state.gap);
  const shown = fire ?? gap;
  const inHand = useBook((state) => state.roomInHand);
  const document = useBook((state) => state.document);
  const input = useRoomInput(shown?.roomId ?? null);
  const frame = useRef<HTMLDivElement>(null);
  const changed = shown !== null && input !== shown.of;
  const left = shown !== null && inHand !== shown.roomId;

  useEffect(() => {
    if (!changed && !left) return;
    player.hide();
    if (changed) session.announce('The room has changed: the fire on the plan was taken away.');
  }, [player, session, changed, left]);
  useEffect(
    () => () => {
      player.hide();
    },
    [player],
  );
  useEffect(() => {
    // On a narrow page what was pressed is out of sight now: the keys go on from here.
    if (window.document.activeElement === window.document.body) frame.current?.querySelector('button')?.focus();
  }, []);

  const hide = (): void => {
    player.hide();
    frame.current?.closest('.plan-page')?.querySelector<HTMLElement>('.plan-canvas')?.focus();
  };
  const nameOf = (id: string): string => document.entries.get(id)?.label ?? 'an entry that is gone';
  if (shown === null) return null;
  const close = (
    <Button size="small" look="quiet" className="spread-close" onClick={hide}>
      Take off the plan
    </Button>
  );
  return (
    <div
      ref={frame}
      className="spread-player"
      role="group"
      aria-label={fire === null ? 'Gap on the plan' : 'Fire on the plan'}
      onKeyDown={(event) => {
        if (event.key !== 'Escape') return;
        event.stopPropagation();
        hide();
      }}
    >
      {fire !== null && <FirePlayer fire={fire} nameOf={nameOf} close={close} />}
      {gap !== null && (
        <div className="spread-now">
          <GapNote gap={gap} nameOf={nameOf} show={show} />
          {close}
        </div>
      )}
    </div>
  );
}
