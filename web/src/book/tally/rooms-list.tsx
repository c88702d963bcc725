import { displayUnit } from '@embertally/shared/units/display-unit';
import { useMemo, useState } from 'react';
import { Button } from '../../components/button.tsx';
import { EmptyState } from '../../components/empty-state.tsx';
import { TextField } from '../../components/text-field.tsx';
import { useUnits } from '../../lib/units-context.ts';
import { useOpenTables } from '../panels/tables-context.ts';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { findInSurvey } from './find-in-survey.ts';
import { LoadBar } from './load-bar.tsx';
import { useQuantity } from '../../lib/use-quantity.ts';
import { useRoomRows } from './use-room-rows.ts';
import './thumb-index.css';

interface RoomsListProps {
  /** Called once a room or an entry was chosen, so that its page can be shown. */
  readonly onChosen?: (kind: 'room' | 'entry') => void;
}

/** The rooms of the building on a narrow screen, with a box to find a room, an entry or a material. */
export function RoomsList({ onChosen }: RoomsListProps) {
  const session = useBookSession();
  const openTables = useOpenTables();
  const units = useUnits();
  const show = useQuantity();
  const rows = useRoomRows('building');
  const document = useBook((state) => state.document);
  const inHand = useBook((state) => state.roomInHand);
  const canEdit = useBook((state) => state.canEdit);
  const [query, setQuery] = useState('');
  const { found, more } = useMemo(() => findInSurvey(document, query), [document, query]);
  const searching = query.trim() !== '';
  const empty = rows.filter((row) => row.entries === 0).length;
  const storeys = [...document.storeys.values()].sort((a, b) => a.level_m - b.level_m);
  const severalStoreys = storeys.length > 1;

  return (
    <div className="grid gap-3">
      <TextField label="Find a room, an entry, a material" type="search" value={query} onChange={setQuery} />
      <div className="flex flex-wrap items-baseline justify-between gap-x-4 border-b-2 border-ink pb-1 text-small text-soft">
        <p role="status">
          {searching
            ? `${found.length + more} found`
            : `${rows.length === 1 ? '1 room' : `${rows.length} rooms`}${empty > 0 ? ` · ${empty} without contents` : ''}`}
        </p>
        <p>{displayUnit('MJ/m2', units)?.symbol}</p>
      </div>
      {rows.length === 0 && (
        <EmptyState
          title="No room yet"
          action={
            canEdit ? (
              <Button
                look="primary"
                onClick={() => {
                  openTables('rooms');
                }}
              >
                Add a room by its measures
              </Button>
            ) : undefined
          }
        >
          Draw rooms on the plan, or add them by their measures. Each then has a line here.
        </EmptyState>
      )}
      {searching ? (
        <ul aria-label="Found">
          {found.map((one) => (
            <li key={`${one.kind} ${one.id}`}>
              <button
                type="button"
                className="rooms-row"
                onClick={() => {
                  session.takeRoom(one.roomId);
                  if (one.kind === 'entry') session.select([{ kind: 'entry', id: one.id }]);
                  onChosen?.(one.kind);
                }}
              >
                <span className="min-w-0">
                  <span className="block font-bold">{one.label}</span>
                  <span className="block text-small text-soft">{one.detail}</span>
                </span>
                <span />
                <span className="text-small text-soft">{one.kind}</span>
              </button>
            </li>
          ))}
          {more > 0 && <li className="py-2 text-small text-soft">{more} more: type another word to narrow it down.</li>}
          {found.length === 0 && (
            <li className="py-2 text-soft">Nothing in this building holds “{query.trim()}”. Try fewer letters.</li>
          )}
        </ul>
      ) : (
        storeys.map((storey) => (
          <section key={storey.id} aria-label={`Rooms, ${storey.name}`}>
            {severalStoreys && <h2 className="pt-3 pb-1 text-small font-bold text-soft">{storey.name}</h2>}
            <ul>
              {rows
                .filter((row) => row.room.storey_id === storey.id)
                .map((row) => {
                  const figure = row.density_MJ_m2 === null ? null : show(row.density_MJ_m2, 'MJ/m2');
                  const area = row.area_m2 === null ? null : show(row.area_m2, 'm2');
                  const marked = row.standing === 'near' || row.standing === 'over';
                  return (
                    <li key={row.room.id}>
                      <button
                        type="button"
                        className="rooms-row"
                        data-standing={row.standing}
                        aria-current={row.room.id === inHand ? 'true' : undefined}
                        onClick={() => {
                          session.takeRoom(row.room.id);
                          onChosen?.('room');
                        }}
                      >
                        <span className="min-w-0">
                          <span className="block font-bold">{row.room.name}</span>
                          <span className="block text-small text-soft">
                            {area === null ? '' : `${area.text} ${area.unit} · `}
                            {row.entries === 1 ? '1 entry' : `${row.entries} entries`}
                          </span>
                        </span>
                        <LoadBar density_MJ_m2={row.density_MJ_m2} />
                        <span className="rooms-figure text-right">
                          <span className="figure">{figure?.text ?? '–'}</span>
                          <span className="unseen"> {figure?.unit ?? 'no density yet'}</span>
                          {marked && ` ${row.standing}`}
                        </span>
                      </button>
                    </li>
                  );
                })}
            </ul>
          </section>
        ))
      )}
    </div>
  );
}
