import * as Ariakit from '@ariakit/react';
import type { ReactNode, RefObject } from 'react';

interface DialogProps {
  readonly open: boolean;
  readonly onClose: () => void;
  readonly title: string;
  /** One sentence under the title. */
  readonly description?: string;
  readonly width?: 'normal' | 'wide';
  readonly initialFocus?: RefObject<HTMLElement | null>;
  /** False while leaving would lose something: Escape and a press outside do nothing. */
  readonly dismissable?: boolean;
  readonly children: ReactNode;
}

/** A question that must be answered before going on. Traps focus and gives it back; Escape closes. */
export function Dialog(props: DialogProps) {
  const { open, onClose, title, description, width = 'normal', initialFocus, dismissable = true, children } = props;
  return (
    <Ariakit.Dialog
      open={open}
      onClose={onClose}
      hideOnEscape={dismissable}
      hideOnInteractOutside={false}
      unmountOnHide
      backdrop={<div className="dialog-veil" />}
      className="dialog"
      data-width={width}
      {...(initialFocus === undefined ? {} : { initialFocus })}
    >
      <div className="flex items-start justify-between gap-4">
        <Ariakit.DialogHeading className="text-title">{title}</Ariakit.DialogHeading>
        {dismissable ? (
          <Ariakit.DialogDismiss className="button" data-look="quiet">
            Close
          </Ariakit.DialogDismiss>
        ) : null}
      </div>
      {description === undefined ? null : (
        <Ariakit.DialogDescription className="text-soft">{description}</Ariakit.DialogDescription>
      )}
      {children}
    </Ariakit.Dialog>
  );
}
