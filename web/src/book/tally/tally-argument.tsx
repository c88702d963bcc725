import type { Limit } from '@embertally/shared/contracts/limits';
import type { Entry, Room } from '@embertally/shared/survey/survey-document';
import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { lazy, memo, type ReactNode, Suspense, useDeferredValue, useMemo } from 'react';
import type { TablePart } from '../panels/tables-context.ts';
import type { Calculation } from '../session/use-calculation.ts';
import { HowFast } from './how-fast.tsx';
import { MadeOf } from './made-of.tsx';
import { MissingList } from './missing-list.tsx';
import { AskSection } from './questions/ask-section.tsx';
import { ResponsePart } from './response-part.tsx';
import { SmokeAndAir } from './smoke-and-air.tsx';
import { TallyCautions } from './tally-cautions.tsx';
import { TallyHeadline } from './tally-headline.tsx';
import { WhatTheRoomDoes } from './what-the-room-does.tsx';

const HowSure = lazy(async () => ({ default: (await import('./uncertainty/how-sure.tsx')).HowSure }));
const SpreadPart = lazy(async () => ({ default: (await import('./spread/spread-part.tsx')).SpreadPart }));

const HowFastKept = memo(HowFast);
const WhatTheRoomDoesKept = memo(WhatTheRoomDoes);
const ResponsePartKept = memo(ResponsePart);
const SmokeAndAirKept = memo(SmokeAndAir);
const MissingListKept = memo(MissingList);

/** These name what they lack themselves. */
const NAMED_BY_THEIR_SECTION: readonly string[] = ['response', 'spread', 'air'];

interface TallyArgumentProps {
  readonly tally: RoomTally;
  /** How sure it is; the band of the tally is the sampled one once this is ready. */
  readonly sure: Calculation<'uncertainty'>;
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
  const { tally, sure, room, entries, limits, contentsAction, onGive, onPickEntry } = props;
  // The density and the ledger move with the very change; curves and tables below them follow without holding it up.
  const later = useDeferredValue(tally);
  const missing = useMemo(
    () => later.missing.filter(({ section }) => !NAMED_BY_THEIR_SECTION.includes(section)),
    [later.missing],
  );
  return (
    <>
      <TallyHeadline tally={tally} limits={limits} />
      <MadeOf
        tally={tally}
        entries={entries}
        action={contentsAction}
        {...(onPickEntry === undefined ? {} : { onPick: onPickEntry })}
      />
      <Suspense fallback={null}>
        <HowSure sure={sure} name={room.name} onPick={onPickEntry} />
      </Suspense>
      <HowFastKept tally={later} />
      <ResponsePartKept tally={later} onGive={onGive} />
      <WhatTheRoomDoesKept tally={later} rating_min={room.rating_min} />
      <Suspense fallback={null}>
        <SpreadPart tally={later} room={room} entries={entries} onGive={onGive} />
      </Suspense>
      <SmokeAndAirKept tally={later} onGive={onGive} />
      <AskSection roomId={room.id} />
      <MissingListKept missing={missing} onGive={onGive} />
      <TallyCautions ids={tally.cautions} />
    </>
  );
}
