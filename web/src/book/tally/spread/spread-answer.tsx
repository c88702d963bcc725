import type { Entry, Room } from '@embertally/shared/survey/survey-document';
import type { RoomTally, SpreadTally } from '@embertally/shared/tally/room-tally';
import { memo, useCallback, useMemo } from 'react';
import { Button } from '../../../components/button.tsx';
import { Disclosure } from '../../../components/disclosure.tsx';
import { useBookSession } from '../../session/use-book-session.ts';
import { useRoomInput } from '../../session/use-room-input.ts';
import type { ShownGap } from '../../spread/spread-play.ts';
import { usePlayer } from '../../spread/use-spread-play.ts';
import { useStillness } from '../../spread/use-stillness.ts';
import { FigureList } from '../figure-list.tsx';
import { firePlayed } from './fire-played.ts';
import { SpreadEvents } from './spread-events.tsx';
import { SpreadGaps } from './spread-gaps.tsx';
import { SpreadChart } from './spread-chart.tsx';
import { SpreadLimits } from './spread-limits.tsx';

const SpreadGapsKept = memo(SpreadGaps);

interface SpreadAnswerProps {
  readonly tally: RoomTally;
  readonly spread: SpreadTally;
  readonly room: Room;
  readonly entries: ReadonlyMap<string, Entry>;
}

/** The fire from entry to entry: its curve, its events, to be played on the plan; and the gaps that are too small. */
export function SpreadAnswer({ tally, spread, room, entries }: SpreadAnswerProps) {
  const session = useBookSession();
  const player = usePlayer();
  const still = useStillness();
  const input = useRoomInput(room.id);
  const fire = useMemo(() => firePlayed(room.id, input, spread), [room.id, input, spread]);
  const nameOf = useCallback((id: string): string => entries.get(id)?.label ?? 'an entry that is gone', [entries]);
  // The plan comes forward, and nothing that is picked lies over the fire.
  const clearPlan = useCallback(() => {
    session.setTool('select');
    session.select([]);
    session.showTables(false);
  }, [session]);
  const show = (at_s: number): void => {
    player.show(fire, at_s);
    clearPlan();
  };
  const showGap = useCallback(
    (gap: Pick<ShownGap, 'from' | 'to' | 'gap_m' | 'enough_m'>): void => {
      player.showGap({ ...gap, roomId: room.id, of: input });
      clearPlan();
    },
    [player, clearPlan, room.id, input],
  );
  return (
    <div className="mt-3 grid grid-cols-[minmax(0,1fr)] gap-4">
      <p className="flex flex-wrap gap-2 print:hidden">
        <Button
          size="small"
          look="primary"
          onClick={() => {
            show(0);
            if (!still) player.run();
          }}
        >
          {still ? 'Show on the plan' : 'Play on the plan'}
        </Button>
      </p>
      <SpreadChart tally={tally} spread={spread} fire={fire} />
      <FigureList
        rows={[
          { path: 'spread.flashover', label: 'Flashover after', estimate: spread.flashover },
          { path: 'spread.peak', label: 'Peak heat release', estimate: spread.peak },
          { path: 'spread.end', label: 'The fire ends after', estimate: spread.end },
          { path: 'spread.heatReleased', label: 'Heat released in all', estimate: spread.heatReleased },
          { path: 'spread.unburnt', label: 'Heat left unburnt', estimate: spread.unburnt },
        ]}
      />
      <SpreadEvents events={spread.events ?? []} fire={fire} nameOf={nameOf} onShow={show} />
      <SpreadGapsKept spread={spread} nameOf={nameOf} onShow={showGap} />
      <Disclosure title="What this leaves out">
        <SpreadLimits spread={spread} />
      </Disclosure>
    </div>
  );
}
