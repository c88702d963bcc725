import type { Sort } from './sort.ts';

interface SortButtonProps {
  readonly column: string;
  readonly label: string;
  readonly sort: Sort | null;
  readonly onSort: (sort: Sort) => void;
}

/** The head of a column that sorts: a first press upwards, the next the other way. */
export function SortButton({ column, label, sort, onSort }: SortButtonProps) {
  const current = sort?.key === column ? sort.direction : null;
  const arrow = current === null ? '' : current === 'ascending' ? '↑' : '↓';
  return (
    <button
      type="button"
      className="ledger-sort"
      onClick={() => {
        onSort({ key: column, direction: current === 'ascending' ? 'descending' : 'ascending' });
      }}
    >
      {label}
      <span aria-hidden="true">{arrow}</span>
    </button>
  );
}
