import { insertCorner } from '@embertally/shared/survey/commands/insert-corner';
import { joinRooms } from '@embertally/shared/survey/commands/join-rooms';
import { middle } from '../interaction/vector.ts';
import type { WallShape } from '../interaction/scene.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { StripVerb } from './strip-verb.tsx';

interface WallStripProps {
  readonly wall: WallShape;
  readonly storeyId: string;
}

/** What can be done with one wall: an opening, a corner in its middle to bend it by, or no wall at all between two rooms. */
export function WallStrip({ wall, storeyId }: WallStripProps) {
  const session = useBookSession();
  const [one, other] = wall.roomIds;
  return (
    <>
      <p className="strip-name">{wall.roomIds.length > 1 ? 'Wall between rooms' : 'Outside wall'}</p>
      <StripVerb
        label="Put an opening"
        onPress={() => {
          session.setTool('opening');
        }}
      />
      <StripVerb
        label="Add a corner"
        onPress={() => {
          const corner_id = session.newId();
          const input = { storey_id: storeyId, wall: wall.corners, corner_id, ...middle(wall.a, wall.b) };
          const result = session.run(insertCorner, input, 'Added a corner');
          if (!result.refused) session.select([{ kind: 'corner', id: corner_id }]);
        }}
      />
      {one !== undefined && other !== undefined && (
        <StripVerb
          label="Join the rooms"
          onPress={() => {
            // The room in hand is the one a person thinks of: it stays.
            const inHand = session.state.roomInHand === other;
            const input = inHand ? { room_id: other, other_id: one } : { room_id: one, other_id: other };
            const result = session.run(joinRooms, input, 'Joined two rooms');
            if (!result.refused) session.select([{ kind: 'room', id: input.room_id }]);
          }}
        />
      )}
    </>
  );
}
