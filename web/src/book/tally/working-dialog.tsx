import { roomInput } from '@embertally/shared/survey/room-input';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { useMemo } from 'react';
import { Dialog } from '../../components/dialog.tsx';
import { useBook } from '../session/use-book.ts';
import { estimateAt } from './estimate-at.ts';
import type { WorkingAsked } from './working-context.ts';
import { WorkingView } from '../../components/working/working-view.tsx';

interface WorkingDialogProps {
  readonly roomId: string;
  readonly asked: WorkingAsked;
  readonly onClose: () => void;
}

/** The working of one number, computed with every step when it is asked for; it moves with the survey while open. */
export function WorkingDialog({ roomId, asked, onClose }: WorkingDialogProps) {
  const document = useBook((state) => state.document);
  const limits = useBook((state) => state.limits);
  const estimate = useMemo(() => {
    if (asked.estimate !== undefined) return asked.estimate;
    if (!document.rooms.has(roomId)) return null;
    return estimateAt(estimateRoom(roomInput(document, roomId, limits), { workings: true, spread: false }), asked.path);
  }, [document, limits, roomId, asked]);
  return (
    <Dialog open onClose={onClose} title={asked.name} width="wide">
      {estimate === null ? (
        <p>This number is not there any more: the room has changed since it was asked for.</p>
      ) : (
        <WorkingView estimate={estimate} name={asked.name} />
      )}
    </Dialog>
  );
}
