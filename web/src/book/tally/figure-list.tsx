import type { Estimate } from '@embertally/shared/methods/estimate';
import { Figure } from './figure.tsx';
import { FigureNotes } from './figure-notes.tsx';

export interface FigureListRow {
  readonly path: string;
  readonly label: string;
  readonly estimate: Estimate | undefined;
  /** A few words after the figure. */
  readonly remark?: string;
}

/** Names at the left, figures at the right, a hairline under each; what was not computed is left out here. */
export function FigureList({ rows }: { readonly rows: readonly FigureListRow[] }) {
  const present = rows.flatMap((row) => (row.estimate === undefined ? [] : [{ ...row, estimate: row.estimate }]));
  if (present.length === 0) return null;
  return (
    <>
      <dl className="text-small">
        {present.map((row) => (
          <div key={row.path} className="flex items-baseline justify-between gap-4 border-b border-rule py-1">
            <dt className="min-w-[40%]">{row.label}</dt>
            <dd className="text-right">
              <Figure path={row.path} estimate={row.estimate} />
              {row.estimate.value === null && row.estimate.never !== undefined && (
                <span className="block text-soft">{row.estimate.never}</span>
              )}
              {row.remark !== undefined && <span className="ml-2 text-soft">{row.remark}</span>}
            </dd>
          </div>
        ))}
      </dl>
      <FigureNotes of={present.map((row) => row.estimate)} />
    </>
  );
}
