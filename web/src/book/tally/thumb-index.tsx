import { displayUnit } from '@embertally/shared/units/display-unit';
import { type KeyboardEvent, useRef } from 'react';
import { Button } from '../../components/button.tsx';
import { useUnits } from '../../lib/units-context.ts';
import { useOpenTables } from '../panels/tables-context.ts';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { LoadBar } from './load-bar.tsx';
import { useQuantity } from '../../lib/use-quantity.ts';
import { useRoomRows } from './use-room-rows.ts';
import './thumb-index.css';

const STEPS: Readonly<Record<string, (at: number, last: number) => number>> = {
  ArrowDown: (at, last) => Math.min(last, at + 1),
  ArrowUp: (at) => Math.max(0, at - 1),
  Home: () => 0,
  End: (_at, last) => last,
};

/**
 * The outer edge of the Book: one tab per room of the storey, with its density, a bar for it and its standing. Tab comes
 * to the chosen one, the arrow keys go on from there.
 */
export function ThumbIndex() {
  const session = useBookSession();
  const openTables = useOpenTables();
  const units = useUnits();
  const show = useQuantity();
  const rows = useRoomRows('storey');
  const inHand = useBook((state) => state.roomInHand);
  const list = useRef<HTMLUListElement>(null);
  const chosen = Math.max(
    0,
    rows.findIndex((row) => row.room.id === inHand),
  );

  const onKeyDown = (event: KeyboardEvent): void => {
    const step = STEPS[event.key];
    if (step === undefined || rows.length === 0) return;
    event.preventDefault();
    const next = step(chosen, rows.length - 1);
    const row = rows[next];
    if (row === undefined) return;
    session.takeRoom(row.room.id);
    list.current?.querySelectorAll('button')[next]?.focus();
  };

  return (
    <nav className="thumb-index" aria-label="Rooms of this storey">
      <p className="thumb-head">Rooms · {displayUnit('MJ/m2', units)?.symbol ?? 'MJ/m²'}</p>
      <ul ref={list} onKeyDown={onKeyDown}>
        {rows.map((row, index) => {
          const figure = row.density_MJ_m2 === null ? null : show(row.density_MJ_m2, 'MJ/m2');
          const marked = row.standing === 'near' || row.standing === 'over';
          return (
            <li key={row.room.id}>
              <button
                type="button"
                className="thumb"
                data-standing={row.standing}
                aria-current={row.room.id === inHand ? 'true' : undefined}
                tabIndex={index === chosen ? 0 : -1}
                onClick={() => {
                  session.takeRoom(row.room.id);
                }}
              >
                <span className="thumb-name">{row.room.name}</span>
                <span className="thumb-line">
                  <LoadBar density_MJ_m2={row.density_MJ_m2} />
                  <span className="figure">
                    {figure?.text ?? '–'}
                    <span className="unseen"> {figure?.unit ?? 'no density yet'}</span>
                    {marked && <span className="thumb-word"> {row.standing}</span>}
                  </span>
                </span>
              </button>
            </li>
          );
        })}
      </ul>
      {rows.length === 0 && <p className="thumb-none">No room on this storey yet.</p>}
      <Button
        look="quiet"
        className="thumb-more text-small"
        onClick={() => {
          openTables('rooms');
        }}
      >
        All as tables
      </Button>
    </nav>
  );
}
