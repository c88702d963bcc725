import { insertCorner } from '@embertally/shared/survey/commands/insert-corner';
import { middle } from '../interaction/vector.ts';
import type { WallShape } from '../interaction/scene.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { StripVerb } from './strip-verb.tsx';

interface WallStripProps {
  readonly wall: WallShape;
  readonly storeyId: string;
}

/** What can be done with one wall: an opening, or a corner in its middle to bend it by. */
export function WallStrip({ wall, storeyId }: WallStripProps) {
  const session = useBookSession();
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
    </>
  );
}
