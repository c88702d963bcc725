import { Button } from '../../components/button.tsx';
import type { ActionWorld } from '../actions/action.ts';
import { useBook } from '../session/use-book.ts';

/** A storey without rooms says what the next step is. */
export function EmptyPlan({ world }: { readonly world: ActionWorld }) {
  const canEdit = useBook((state) => state.canEdit);
  return (
    <div className="plan-empty">
      <h2 className="text-lead font-bold">No rooms yet</h2>
      <p>
        {canEdit
          ? 'Draw the first room: drag a rectangle over the floor, or press corner by corner.'
          : 'Nobody has drawn a room in this building yet.'}
      </p>
      {canEdit ? (
        <Button
          look="primary"
          onClick={() => {
            world.session.setTool('draw-room');
          }}
        >
          Draw a room
        </Button>
      ) : null}
    </div>
  );
}
