import type { ReactNode } from 'react';

interface DisclosureProps {
  readonly title: string;
  readonly open?: boolean;
  /** Called each time it is unfolded. */
  readonly onOpen?: () => void;
  readonly children: ReactNode;
}

/** Something that can be unfolded below its title. */
export function Disclosure({ title, open, onOpen, children }: DisclosureProps) {
  return (
    <details
      className="fold"
      open={open}
      onToggle={(event) => {
        if (event.currentTarget.open) onOpen?.();
      }}
    >
      <summary>{title}</summary>
      <div className="pb-3">{children}</div>
    </details>
  );
}
