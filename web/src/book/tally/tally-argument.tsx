import type { Limit } from '@embertally/shared/contracts/limits';
import type { Entry, Room } from '@embertally/shared/survey/survey-document';
import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { memo, type ReactNode, useDeferredValue } from 'react';
import type { TablePart } from '../panels/tables-context.ts';
import { HowFast } from './how-fast.tsx';
import { MadeOf } from './made-of.tsx';
import { MissingList } from './missing-list.tsx';
import { TallyCautions } from './tally-cautions.tsx';
import { TallyHeadline } from './tally-headline.tsx';
import { WhatTheRoomDoes } from './what-the-room-does.tsx';

const HowFastKept = memo(HowFast);
const WhatTheRoomDoesKept = memo(WhatTheRoomDoes);
const MissingListKept = memo(MissingList);

interface TallyArgumentProps {
  readonly tally: RoomTally;
  readonly room: Room;
  readonly entries: ReadonlyMap<string, Entry>;
  /** Of this room. */
  readonly limits: readonly Limit[];
  readonly contentsAction?: ReactNode;
  /** Opens the table where an input that is wanting can be given. */
  readonly onGive?: ((part: TablePart) => void) | undefined;
  readonly onPickEntry?: (entryId: string) => void;
}

/** The results of one room, read from top to bottom as an argument. */
export function TallyArgument(props: TallyArgumentProps) {
  const { tally, room, entries, limits, contentsAction, onGive, onPickEntry } = props;
  // The density and the ledger move with the very change; curves and tables below them follow without holding it up.
  const later = useDeferredValue(tally);
  return (
    <>
      <TallyHeadline tally={tally} limits={limits} />
      <MadeOf
        tally={tally}
        entries={entries}
        action={contentsAction}
        {...(onPickEntry === undefined ? {} : { onPick: onPickEntry })}
      />
      <HowFastKept tally={later} />
      <WhatTheRoomDoesKept tally={later} rating_min={room.rating_min} />
      <MissingListKept missing={later.missing} onGive={onGive} />
      <TallyCautions ids={tally.cautions} />
    </>
  );
}
