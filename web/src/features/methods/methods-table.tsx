import { Table, type Column } from '../../components/table.tsx';
import { FormulaText } from '../../components/working/formula-text.tsx';
import { plainUnits } from '../../lib/plain-units.ts';
import type { MethodRow } from './method-summaries.ts';

const COLUMNS: readonly Column<MethodRow>[] = [
  {
    key: 'method',
    header: 'Method',
    rowHeader: true,
    cell: (row) => (
      <>
        {row.title}
        <span className="block text-small font-normal text-soft">
          <FormulaText>{plainUnits(row.gives)}</FormulaText>
        </span>
        <span className="figure block text-small font-normal break-words text-soft">{row.ref}</span>
      </>
    ),
  },
  {
    key: 'relation',
    header: 'Relation',
    cell: (row) => (
      <span data-text="long" className="[overflow-wrap:anywhere]">
        <FormulaText>{plainUnits(row.equation)}</FormulaText>
      </span>
    ),
  },
  {
    key: 'range',
    header: 'Made for',
    cell: (row) => (
      <span data-text="long" className="text-small">
        {row.ranges.length === 0 ? (
          'named cases only'
        ) : (
          <FormulaText>{`${plainUnits(row.ranges.join('; '))}; ${row.outside}`}</FormulaText>
        )}
      </span>
    ),
  },
  {
    key: 'source',
    header: 'Source',
    cell: (row) => (
      <ul data-text="long" className="grid gap-1 text-small">
        {row.sources.map(({ text, fromMemory }) => (
          <li key={text}>
            <FormulaText>{text}</FormulaText>
            {fromMemory && <span className="text-soft"> – from memory, to be read again</span>}
          </li>
        ))}
      </ul>
    ),
  },
];

/** The methods of one topic. */
export function MethodsTable({
  caption,
  methods,
}: {
  readonly caption: string;
  readonly methods: readonly MethodRow[];
}) {
  return <Table caption={caption} captionUnseen columns={COLUMNS} rows={methods} rowKey={(row) => row.ref} />;
}
