import type { ReactNode } from 'react';

interface DisclosureProps {
  readonly title: string;
  readonly open?: boolean;
  readonly children: ReactNode;
}

/** Something that can be unfolded below its title. */
export function Disclosure({ title, open, children }: DisclosureProps) {
  return (
    <details className="fold" open={open}>
      <summary>{title}</summary>
      <div className="pb-3">{children}</div>
    </details>
  );
}
