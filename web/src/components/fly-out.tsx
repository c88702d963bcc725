import { useId, type ReactNode } from 'react';

interface FlyOutProps {
  /** What the button shows; seen, not heard. */
  readonly button: ReactNode;
  /** What the button is called. */
  readonly label: string;
  readonly children: ReactNode;
}

/**
 * A few links and facts behind a button at the right end of the header, by the browser's own popover: it closes on
 * Escape and on a press elsewhere, and gives focus back. For a list of commands use `Menu`.
 */
export function FlyOut({ button, label, children }: FlyOutProps) {
  const id = `fly-out-${useId().replaceAll(/[^\w-]/g, '')}`;
  return (
    <>
      <button type="button" className="button" data-look="quiet" popoverTarget={id}>
        <span aria-hidden="true">{button}</span>
        <span className="unseen">{label}</span>
      </button>
      <div
        id={id}
        popover="auto"
        className="menu fly-out"
        onClick={(event) => {
          // A link inside leads away: the fly-out has done its work.
          if (event.target instanceof Element && event.target.closest('a') !== null) event.currentTarget.hidePopover();
        }}
      >
        {children}
      </div>
    </>
  );
}
