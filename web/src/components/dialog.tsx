import { useId, useLayoutEffect, useRef, type ReactNode, type RefObject } from 'react';
import { createPortal } from 'react-dom';
import { Button } from './button.tsx';

interface DialogProps {
  readonly open: boolean;
  readonly onClose: () => void;
  readonly title: string;
  /** One sentence under the title. */
  readonly description?: string;
  readonly width?: 'normal' | 'wide';
  readonly initialFocus?: RefObject<HTMLElement | null>;
  /** False while leaving would lose something: Escape does nothing. */
  readonly dismissable?: boolean;
  readonly children: ReactNode;
}

/** A question that must be answered before going on. Traps focus and gives it back; Escape closes. */
export function Dialog({ open, ...props }: DialogProps) {
  // Outside of the page it was asked from: that page may be turned away meanwhile, and the question with it.
  return open ? createPortal(<OpenDialog {...props} />, document.body) : null;
}

/** The browser's own modal dialog: what lies behind it can be neither reached nor heard. */
function OpenDialog(props: Omit<DialogProps, 'open'>) {
  const { onClose, title, description, width = 'normal', initialFocus, dismissable = true, children } = props;
  const box = useRef<HTMLDialogElement>(null);
  const id = useId();

  useLayoutEffect(() => {
    const dialog = box.current;
    const before = document.activeElement;
    dialog?.showModal();
    (initialFocus?.current ?? dialog?.querySelector<HTMLElement>(FOCUSABLE))?.focus();
    return () => {
      dialog?.close();
      if (before instanceof HTMLElement && before.isConnected) before.focus();
    };
  }, [initialFocus]);

  const leave = (event: { preventDefault: () => void; stopPropagation: () => void }): void => {
    event.preventDefault();
    event.stopPropagation();
    if (dismissable) onClose();
  };
  return (
    <dialog
      ref={box}
      className="dialog"
      data-width={width}
      aria-labelledby={`${id}-title`}
      aria-describedby={description === undefined ? undefined : `${id}-description`}
      onCancel={leave}
      onKeyDown={(event) => {
        if (event.key === 'Escape') leave(event);
      }}
    >
      <div className="flex items-start justify-between gap-4">
        <h1 id={`${id}-title`} className="text-title">
          {title}
        </h1>
        {dismissable ? (
          <Button look="quiet" onClick={onClose}>
            Close
          </Button>
        ) : null}
      </div>
      {description === undefined ? null : (
        <p id={`${id}-description`} className="text-soft">
          {description}
        </p>
      )}
      {children}
    </dialog>
  );
}

const FOCUSABLE = 'a[href], button:not([disabled]), input:not([disabled]), select, textarea, [tabindex="0"]';
