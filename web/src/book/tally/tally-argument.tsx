import type { Limit } from '@embertally/shared/contracts/limits';
import type { Entry, Room } from '@embertally/shared/survey/survey-document';
import type { RoomTally } from '@embertally/shared/tally/room-tally';
import type { ReactNode } from 'react';
import type { TablePart } from '../panels/tables-context.ts';
import { HowFast } from './how-fast.tsx';
import { MadeOf } from './made-of.tsx';
import { MissingList } from './missing-list.tsx';
import { TallyCautions } from './tally-cautions.tsx';
import { TallyHeadline } from './tally-headline.tsx';
import { WhatTheRoomDoes } from './what-the-room-does.tsx';

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
  return (
    <>
      <TallyHeadline tally={tally} limits={limits} />
      <MadeOf
        tally={tally}
        entries={entries}
        action={contentsAction}
        {...(onPickEntry === undefined ? {} : { onPick: onPickEntry })}
      />
      <HowFast tally={tally} />
      <WhatTheRoomDoes tally={tally} rating_min={room.rating_min} />
      <MissingList missing={tally.missing} onGive={onGive} />
      <TallyCautions ids={tally.cautions} />
    </>
  );
}
