import type { Entry, Room } from '@embertally/shared/survey/survey-document';
import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Notice } from '../../../components/notice.tsx';
import type { TablePart } from '../../panels/tables-context.ts';
import { useRoomSpread } from '../../session/use-room-spread.ts';
import { MissingReasons } from '../missing-reasons.tsx';
import { TallySection } from '../tally-section.tsx';
import { FirstEntry } from './first-entry.tsx';
import { SpreadAnswer } from './spread-answer.tsx';
import './spread.css';

interface SpreadPartProps {
  readonly tally: RoomTally;
  readonly room: Room;
  readonly entries: ReadonlyMap<string, Entry>;
  readonly onGive?: ((part: TablePart) => void) | undefined;
}

/** Which entry ignites which: worked out in the background once the survey is quiet, then played on the plan. */
export function SpreadPart({ tally, room, entries, onGive }: SpreadPartProps) {
  // Until somebody chooses here it is what the room says of itself.
  const [asked, setAsked] = useState<string | null>();
  const chosen = asked === undefined ? (room.assumptions?.first_entry ?? null) : asked;
  const first = chosen !== null && entries.get(chosen)?.room_id === room.id ? chosen : null;
  const { state, value, message, stop, again } = useRoomSpread(room.id, first);
  const missing = value?.missing.filter(({ section }) => section === 'spread') ?? [];
  const spread = value?.spread;
  return (
    <TallySection title="What sets what alight">
      {(state === 'waiting' || state === 'running') && (
        <div role="status" className="flex flex-wrap items-center gap-x-4 text-small text-soft">
          <p>
            {first === null ? 'Trying what burns first, to find the worst…' : 'Following the fire from entry to entry…'}
          </p>
          <Button look="quiet" className="text-small" onClick={stop}>
            Stop
          </Button>
        </div>
      )}
      {state === 'stopped' && (
        <p className="flex flex-wrap items-center gap-x-4 text-small">
          Stopped before there was an answer.
          <Button look="quiet" className="text-small" onClick={again}>
            Work it out
          </Button>
        </p>
      )}
      {state === 'failed' && (
        <Notice tone="problem" title="What sets what alight could not be worked out">
          <p>{message} The other numbers of this room are not touched by it.</p>
          <Button size="small" onClick={again}>
            Try again
          </Button>
        </Notice>
      )}
      {spread?.events !== undefined && (
        <>
          <FirstEntry spread={spread} room={room} entries={entries} chosen={first} onChoose={setAsked} />
          <SpreadAnswer tally={tally} spread={spread} room={room} entries={entries} />
        </>
      )}
      <MissingReasons missing={missing} onGive={onGive} />
    </TallySection>
  );
}
