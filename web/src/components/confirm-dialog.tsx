import { useRef, type ReactNode } from 'react';
import { Button } from './button.tsx';
import { Dialog } from './dialog.tsx';

interface ConfirmDialogProps {
  readonly open: boolean;
  readonly title: string;
  /** Names the thing and what follows. */
  readonly children: ReactNode;
  /** The verb: "Take the role away". */
  readonly confirm: string;
  readonly busy?: boolean;
  readonly onConfirm: () => void;
  readonly onClose: () => void;
}

/** Asks before something that cannot simply be undone. The way back has the focus, not the deed. */
export function ConfirmDialog({ open, title, children, confirm, busy, onConfirm, onClose }: ConfirmDialogProps) {
  const back = useRef<HTMLButtonElement>(null);
  return (
    <Dialog open={open} onClose={onClose} title={title} initialFocus={back}>
      <div className="grid gap-2">{children}</div>
      <div className="flex flex-wrap justify-end gap-3">
        <Button ref={back} onClick={onClose}>
          Keep it as it is
        </Button>
        <Button look="destructive" busy={busy ?? false} onClick={onConfirm}>
          {confirm}
        </Button>
      </div>
    </Dialog>
  );
}
