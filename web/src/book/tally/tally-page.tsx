import { lazy, Suspense, useEffect, useMemo, useRef, useState } from 'react';
import { Button } from '../../components/button.tsx';
import { EmptyState } from '../../components/empty-state.tsx';
import { LinkButton } from '../../components/link-button.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import { paths } from '../../lib/paths.ts';
import { useUnits } from '../../lib/units-context.ts';
import { useOpenTables } from '../panels/tables-context.ts';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { useRoomTally } from '../session/use-room-tally.ts';
import { useRoomUncertainty } from '../session/use-room-uncertainty.ts';
import { roomLine } from './room-line.ts';
import { TallyArgument } from './tally-argument.tsx';
import { withSamples } from './with-samples.ts';
import { type WorkingAsked, WorkingContext } from './working-context.ts';
import './tally.css';

const WorkingDialog = lazy(() => import('./working-dialog.tsx').then((module) => ({ default: module.WorkingDialog })));

/** The tally of the room in hand; it moves with every change of the survey. */
export function TallyPage() {
  const session = useBookSession();
  const openTables = useOpenTables();
  const units = useUnits();
  const document = useBook((state) => state.document);
  const allLimits = useBook((state) => state.limits);
  const roomId = useBook((state) => state.roomInHand);
  const surveyId = useBook((state) => state.survey.id);
  const canEdit = useBook((state) => state.canEdit);
  const quick = useRoomTally(roomId);
  const sure = useRoomUncertainty(roomId);
  const tally = useMemo(() => (quick === null ? null : withSamples(quick, sure.value)), [quick, sure.value]);
  const [asked, setAsked] = useState<WorkingAsked | null>(null);
  const limits = useMemo(() => allLimits.filter((limit) => limit.room_id === roomId), [allLimits, roomId]);
  const room = roomId === null ? undefined : document.rooms.get(roomId);
  const article = useRef<HTMLElement>(null);
  // Another room is another page: it is read from its top.
  useEffect(() => {
    article.current?.parentElement?.scrollTo?.(0, 0);
  }, [roomId]);

  if (roomId === null || room === undefined) {
    return (
      <EmptyState
        title="No room on this storey yet"
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
        Draw the first room on the plan, or add one by its measures. Its tally then stands here: how much heat is kept,
        how fast it could come out, and what that would do to the room.
      </EmptyState>
    );
  }
  return (
    <WorkingContext value={setAsked}>
      <article ref={article} aria-labelledby="tally-room" className="tally">
        <header className="mb-4">
          <h2 id="tally-room" className="text-title">
            {room.name}
          </h2>
          <p className="text-small text-soft">{roomLine(document, room, units)}</p>
          <p className="flex flex-wrap gap-x-4 text-small print:hidden">
            {canEdit && (
              <Button
                look="quiet"
                className="text-small"
                onClick={() => {
                  openTables('room');
                }}
              >
                What is known of this room
              </Button>
            )}
            <Button
              look="quiet"
              className="text-small"
              onClick={() => {
                openTables('limits');
              }}
            >
              Limits
            </Button>
            <LinkButton look="quiet" className="text-small" to={paths.workings(surveyId, roomId)}>
              All workings, to print
            </LinkButton>
          </p>
        </header>
        {tally === null ? (
          <Skeleton label={`Adding up ${room.name}`} lines={8} />
        ) : (
          <TallyArgument
            key={room.id}
            tally={tally}
            sure={sure}
            room={room}
            entries={document.entries}
            limits={limits}
            contentsAction={
              <Button
                look="quiet"
                className="text-small"
                onClick={() => {
                  openTables('contents');
                }}
              >
                {canEdit ? 'Add or edit contents' : 'Contents as a table'}
              </Button>
            }
            onGive={canEdit ? openTables : undefined}
            onPickEntry={(entryId) => {
              session.select([{ kind: 'entry', id: entryId }]);
            }}
          />
        )}
      </article>
      {asked !== null && (
        <Suspense fallback={null}>
          <WorkingDialog
            roomId={roomId}
            asked={asked}
            onClose={() => {
              setAsked(null);
            }}
          />
        </Suspense>
      )}
    </WorkingContext>
  );
}
