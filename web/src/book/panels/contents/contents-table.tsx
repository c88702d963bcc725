import { editEntries } from '@embertally/shared/survey/commands/edit-entries';
import type { Entry, Room } from '@embertally/shared/survey/survey-document';
import { displayUnit } from '@embertally/shared/units/display-unit';
import { lazy, Suspense, useCallback, useMemo, useRef, useState } from 'react';
import { useUnits } from '../../../lib/units-context.ts';
import { useBook } from '../../session/use-book.ts';
import { useNewerHeats } from '../../session/use-newer-heats.ts';
import { useRoomTally } from '../../session/use-room-tally.ts';
import { useRunBack } from '../run-back.ts';
import { useRowFocus } from '../use-row-focus.ts';
import { useRowsInView } from '../use-rows-in-view.ts';
import { EntryRow } from './entry-row.tsx';

const EntryDialog = lazy(() => import('./entry-dialog.tsx').then((module) => ({ default: module.EntryDialog })));

/** From so many rows on only those in sight are in the page. */
const LONG = 200;

interface ContentsTableProps {
  readonly room: Room;
  readonly entries: readonly Entry[];
  readonly canEdit: boolean;
}

/** The contents of a room, changed where they stand. */
export function ContentsTable({ room, entries, canEdit }: ContentsTableProps) {
  const units = useUnits();
  const runBack = useRunBack();
  const tally = useRoomTally(room.id);
  const picked = useBook((state) => state.selection);
  const newer = useNewerHeats();
  const [open, setOpen] = useState<string | null>(null);
  const { rootRef, focusAfter } = useRowFocus<HTMLDivElement>();
  const scroll = useRef<HTMLDivElement | null>(null);
  const long = entries.length > LONG;
  const heats = useMemo(
    () => new Map((tally?.load.byEntry ?? []).map((share) => [share.id, share.heat.value])),
    [tally],
  );
  const pickedIds = useMemo(() => new Set(picked.map((one) => one.id)), [picked]);
  const inView = useRowsInView(scroll, entries.length);
  const { from, to } = long ? inView : { from: 0, to: entries.length };
  const before_px = long ? inView.before_px : 0;
  const after_px = long ? inView.after_px : 0;
  const edit = useCallback(
    (entry: Entry, patch: Partial<Omit<Entry, 'id' | 'room_id'>>) =>
      runBack(editEntries, { entry_ids: [entry.id], patch }, `Changed ${entry.label}`),
    [runBack],
  );
  const symbol = (unit: string): string => displayUnit(unit, units)?.symbol ?? unit;
  const opened = open === null ? undefined : entries.find((entry) => entry.id === open);

  return (
    <div ref={rootRef} tabIndex={-1}>
      <div
        ref={scroll}
        className="rows-scroll"
        data-long={long ? 'yes' : 'no'}
        role="region"
        aria-label={`Contents of ${room.name}`}
        tabIndex={0}
      >
        <table role="table" className="ledger entries" aria-rowcount={long ? entries.length + 1 : undefined}>
          <caption>
            {entries.length === 1 ? '1 entry' : `${entries.length} entries`} in {room.name}
          </caption>
          <thead role="rowgroup">
            <tr role="row" aria-rowindex={long ? 1 : undefined}>
              <th role="columnheader" scope="col">
                Entry
              </th>
              <th role="columnheader" scope="col">
                Count
              </th>
              <th role="columnheader" scope="col">
                Mass of one, {symbol('kg')}
              </th>
              <th role="columnheader" scope="col">
                Kept
              </th>
              <th role="columnheader" scope="col">
                How known
              </th>
              <th role="columnheader" scope="col" data-align="end">
                Heat, {symbol('MJ')}
              </th>
              <th role="columnheader" scope="col">
                {canEdit ? 'Change' : 'Read'}
              </th>
            </tr>
          </thead>
          <tbody role="rowgroup">
            {before_px > 0 && (
              <tr aria-hidden="true">
                <td colSpan={7} style={{ height: before_px, padding: 0 }} />
              </tr>
            )}
            {entries.slice(from, to).map((entry, index) => (
              <EntryRow
                key={entry.id}
                entry={entry}
                heat_MJ={heats.get(entry.id) ?? null}
                canEdit={canEdit}
                picked={pickedIds.has(entry.id)}
                newerHeat={newer.of(entry).length > 0}
                rowIndex={long ? from + index + 2 : undefined}
                edit={edit}
                onOpen={setOpen}
                onLeave={focusAfter}
              />
            ))}
            {after_px > 0 && (
              <tr aria-hidden="true">
                <td colSpan={7} style={{ height: after_px, padding: 0 }} />
              </tr>
            )}
          </tbody>
        </table>
      </div>
      {opened !== undefined && (
        <Suspense fallback={null}>
          <EntryDialog
            entry={opened}
            canEdit={canEdit}
            edit={edit}
            onClose={() => {
              setOpen(null);
            }}
          />
        </Suspense>
      )}
    </div>
  );
}
