import type { ReactNode } from 'react';

interface NoticeProps {
  readonly tone?: 'plain' | 'caution' | 'problem';
  readonly title?: string;
  readonly children: ReactNode;
  /** Said aloud when it appears; only for something the person did not just ask for. */
  readonly announced?: boolean;
}

/** Something to know, in the flow of the page. */
export function Notice({ tone = 'plain', title, children, announced = false }: NoticeProps) {
  return (
    <div className="notice" data-tone={tone} role={announced ? (tone === 'problem' ? 'alert' : 'status') : undefined}>
      {title === undefined ? null : <p className="font-bold">{title}</p>}
      <div>{children}</div>
    </div>
  );
}
