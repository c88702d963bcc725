import { Table, type Column } from '@embertally/web/src/components/table.tsx';
import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';

interface Row {
  readonly name: string;
  readonly mass: number | null;
}

const ROWS: readonly Row[] = [
  { name: 'Bay 10', mass: 5 },
  { name: 'Bay 9', mass: null },
  { name: 'annexe', mass: 40 },
];

const COLUMNS: readonly Column<Row>[] = [
  { key: 'name', header: 'Name', rowHeader: true, sortBy: (row) => row.name, cell: (row) => row.name },
  { key: 'mass', header: 'Mass, kg', numeric: true, sortBy: (row) => row.mass, cell: (row) => row.mass ?? '–' },
];

function names(sort: { key: string; direction: 'ascending' | 'descending' } | null): (string | null)[] {
  const { unmount } = render(
    <Table
      caption="Masses"
      columns={COLUMNS}
      rows={ROWS}
      rowKey={(row) => row.name}
      sort={sort}
      onSort={() => undefined}
    />,
  );
  const found = screen.getAllByRole('rowheader').map((cell) => cell.textContent);
  unmount();
  return found;
}

describe('a table', () => {
  it('has a caption, column heads and a head for every row', () => {
    render(<Table caption="Masses" columns={COLUMNS} rows={ROWS} rowKey={(row) => row.name} />);
    expect(screen.getByRole('table', { name: 'Masses' })).toBeTruthy();
    expect(screen.getAllByRole('columnheader').map((head) => head.getAttribute('scope'))).toEqual(['col', 'col']);
    expect(screen.getAllByRole('rowheader').map((head) => head.getAttribute('scope'))).toEqual(['row', 'row', 'row']);
  });

  it('comes as it was given until it is sorted', () => {
    expect(names(null)).toEqual(['Bay 10', 'Bay 9', 'annexe']);
    expect(names({ key: 'gone', direction: 'ascending' })).toEqual(['Bay 10', 'Bay 9', 'annexe']);
  });

  it('sorts words as people do: numbers in them by size, capitals aside', () => {
    expect(names({ key: 'name', direction: 'ascending' })).toEqual(['annexe', 'Bay 9', 'Bay 10']);
  });

  it('puts rows without a figure last, whichever way it is turned', () => {
    expect(names({ key: 'mass', direction: 'ascending' })).toEqual(['Bay 10', 'annexe', 'Bay 9']);
    expect(names({ key: 'mass', direction: 'descending' })).toEqual(['annexe', 'Bay 10', 'Bay 9']);
  });

  it('that scrolls does so in a region that can be reached and is named', () => {
    render(<Table caption="Masses" columns={COLUMNS} rows={ROWS} rowKey={(row) => row.name} narrow="scroll" />);
    expect(screen.getByRole('region', { name: 'Masses' }).tabIndex).toBe(0);
  });
});
