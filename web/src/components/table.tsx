import type { ReactNode } from 'react';
import { SortButton } from './sort-button.tsx';
import type { Sort } from './sort.ts';

export interface Column<Row> {
  readonly key: string;
  /** With the unit of the figures below it, where they have one. */
  readonly header: string;
  readonly cell: (row: Row) => ReactNode;
  /** Figures: to the right, equal widths. */
  readonly numeric?: boolean;
  /** Names the row; the first such column is the row's header. */
  readonly rowHeader?: boolean;
  /** What to sort by; absent: the column cannot be sorted. Null sorts last either way. */
  readonly sortBy?: (row: Row) => string | number | null;
  /** True where the cell of this row shows nothing worth a line of its own on a narrow page. */
  readonly emptyOnNarrow?: (row: Row) => boolean;
}

interface TableProps<Row> {
  readonly caption: string;
  readonly captionUnseen?: boolean;
  readonly columns: readonly Column<Row>[];
  readonly rows: readonly Row[];
  readonly rowKey: (row: Row) => string;
  readonly sort?: Sort | null;
  readonly onSort?: (sort: Sort) => void;
  readonly foot?: ReactNode;
  /** On a narrow page: each row a list of labelled pairs, or the table scrolls sideways in its own region. */
  readonly narrow?: 'pairs' | 'scroll';
}

/** Rows of a ledger. The roles are spelled out because a row that is laid out as pairs would lose them. */
export function Table<Row>(props: TableProps<Row>) {
  const { caption, captionUnseen, columns, rows, rowKey, sort = null, onSort, foot, narrow = 'pairs' } = props;
  const shown = sortRows(rows, columns, sort);
  const table = (
    <table className="ledger" role="table" data-narrow={narrow}>
      <caption className={captionUnseen ? 'unseen' : undefined}>{caption}</caption>
      <thead role="rowgroup">
        <tr role="row">
          {columns.map((column) => (
            <th
              key={column.key}
              role="columnheader"
              scope="col"
              data-align={column.numeric ? 'end' : undefined}
              aria-sort={sort?.key === column.key ? sort.direction : undefined}
            >
              {column.sortBy === undefined || onSort === undefined ? (
                column.header
              ) : (
                <SortButton column={column.key} label={column.header} sort={sort} onSort={onSort} />
              )}
            </th>
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup">
        {shown.map((row) => (
          <tr key={rowKey(row)} role="row">
            {columns.map((column) =>
              column.rowHeader ? (
                <th key={column.key} role="rowheader" scope="row">
                  {column.cell(row)}
                </th>
              ) : (
                <td
                  key={column.key}
                  role="cell"
                  data-label={column.header}
                  data-align={column.numeric ? 'end' : undefined}
                  data-empty={column.emptyOnNarrow?.(row) ? 'yes' : undefined}
                >
                  <div>{column.cell(row)}</div>
                </td>
              ),
            )}
          </tr>
        ))}
      </tbody>
      {foot === undefined ? null : <tfoot role="rowgroup">{foot}</tfoot>}
    </table>
  );
  if (narrow === 'pairs') return <div className="ledger-frame">{table}</div>;
  return (
    <div role="region" aria-label={caption} tabIndex={0} className="overflow-x-auto">
      {table}
    </div>
  );
}

function sortRows<Row>(rows: readonly Row[], columns: readonly Column<Row>[], sort: Sort | null): readonly Row[] {
  const by = columns.find((column) => column.key === sort?.key)?.sortBy;
  if (sort === null || by === undefined) return rows;
  const turn = sort.direction === 'ascending' ? 1 : -1;
  return rows.toSorted((a, b) => {
    const left = by(a);
    const right = by(b);
    if (left === null || right === null) return Number(left === null) - Number(right === null);
    if (typeof left === 'number' && typeof right === 'number') return turn * (left - right);
    return turn * String(left).localeCompare(String(right), undefined, { numeric: true, sensitivity: 'base' });
  });
}
