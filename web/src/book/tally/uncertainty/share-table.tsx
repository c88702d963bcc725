import type { RoomUncertainty, UncertaintyShare } from '@embertally/shared/uncertainty/room-uncertainty';
import { Figure } from '../figure.tsx';

interface ShareTableProps {
  readonly shares: RoomUncertainty['shares'];
  /** Picks an entry on the plan; absent where there is no plan. */
  readonly onPick?: ((entryId: string) => void) | undefined;
}

/** Every share with its working; an input that belongs to one entry picks it on the plan. */
export function ShareTable({ shares, onPick }: ShareTableProps) {
  return (
    <div className="max-h-72 overflow-auto" role="region" tabIndex={0} aria-label="Table: what matters most">
      <table className="tally-ledger w-full text-small">
        <caption className="unseen">Share of the variance of the density by input</caption>
        <thead className="sticky top-0 bg-page">
          <tr>
            <th scope="col">Input</th>
            <th scope="col" data-align="end">
              Share of the variance
            </th>
          </tr>
        </thead>
        <tbody>
          {shares.map((row, index) => (
            <tr key={row.key}>
              <th scope="row">
                <InputName row={row} onPick={onPick} />
              </th>
              <td data-align="end">
                <Figure path={`uncertainty.shares.${index}.share`} estimate={row.share} row={row.label} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function InputName({ row, onPick }: { row: UncertaintyShare; onPick: ShareTableProps['onPick'] }) {
  const [entryId] = row.entryIds;
  if (onPick === undefined || entryId === undefined || row.entryIds.length > 1) return row.label;
  return (
    <button
      type="button"
      className="ledger-entry"
      onClick={() => {
        onPick(entryId);
      }}
    >
      {row.label}
    </button>
  );
}
