import type { SpreadTally, SpreadTallyGap } from '@embertally/shared/tally/room-tally';
import { displayUnit } from '@embertally/shared/units/display-unit';
import { useMemo, useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { SortButton } from '../../../components/sort-button.tsx';
import type { Sort } from '../../../components/sort.ts';
import { useUnits } from '../../../lib/units-context.ts';
import type { ShownGap } from '../../spread/spread-play.ts';
import { Figure } from '../figure.tsx';

const FIRST = 20;
const LENGTHS = ['gap_m', 'just_not_m', 'enough_m', 'long_exposure_m'] as const;
const HEADS = { gap_m: 'Now', just_not_m: 'Just not', enough_m: 'Enough', long_exposure_m: 'However long' } as const;

interface SpreadGapsProps {
  readonly spread: SpreadTally;
  readonly nameOf: (id: string) => string;
  /** Draws a gap on the plan. */
  readonly onShow: (gap: Pick<ShownGap, 'from' | 'to' | 'gap_m' | 'enough_m'>) => void;
}

interface Row extends SpreadTallyGap {
  readonly index: number;
  readonly names: string;
}

/** Pairs that stand nearer than what is enough; the largest shortfall first. */
export function SpreadGaps({ spread, nameOf, onShow }: SpreadGapsProps) {
  const [sort, setSort] = useState<Sort | null>(null);
  const [all, setAll] = useState(false);
  const metre = displayUnit('m', useUnits())?.symbol ?? 'm';
  const { gaps = [], pairs = 0, pairsShort = gaps.length } = spread;
  const rows = useMemo(
    () => gaps.map((gap, index): Row => ({ ...gap, index, names: `${nameOf(gap.from)} to ${nameOf(gap.to)}` })),
    [gaps, nameOf],
  );
  if (gaps.length === 0) return <p className="text-small">{noneWords(pairs)}</p>;
  const sorted = sort === null ? rows : sortRows(rows, sort);
  const shown = all || rows.length <= FIRST + 5 ? sorted : sorted.slice(0, FIRST);
  const never = new Set(gaps.flatMap((gap) => LENGTHS.flatMap((key) => gap[key].never ?? [])));
  return (
    <div>
      <p className="mb-2 max-w-[72ch] text-small">
        {pairsShort === 1 ? '1 pair stands' : `${pairsShort} pairs stand`} nearer than what is enough, of {pairs} within
        10 m of each other. Enough counts twice the radiation; however long counts its peak for ever. Each pair is taken
        alone: with three entries a larger gap can even light the third one.
      </p>
      <table role="table" className="tally-ledger gap-table w-full text-small">
        <caption className="unseen">Gaps that are too small, in {metre}</caption>
        <thead role="rowgroup">
          <tr role="row">
            {[['names', `From, to`] as const, ...LENGTHS.map((key) => [key, HEADS[key]] as const)].map(
              ([key, label]) => (
                <th
                  key={key}
                  role="columnheader"
                  scope="col"
                  data-align={key === 'names' ? undefined : 'end'}
                  aria-sort={sort?.key === key ? sort.direction : undefined}
                >
                  <SortButton column={key} label={label} sort={sort} onSort={setSort} />
                  {key !== 'names' && <span className="block font-normal">{metre}</span>}
                </th>
              ),
            )}
          </tr>
        </thead>
        <tbody role="rowgroup">
          {shown.map((row) => (
            <tr key={`${row.from} ${row.to}`} role="row">
              <th role="rowheader" scope="row">
                <button
                  type="button"
                  className="ledger-entry"
                  aria-label={`${row.names}: show the gap on the plan`}
                  onClick={() => {
                    onShow({ from: row.from, to: row.to, gap_m: row.gap_m.value ?? 0, enough_m: row.enough_m.value });
                  }}
                >
                  {nameOf(row.from)} <span className="block text-soft">to {nameOf(row.to)}</span>
                </button>
              </th>
              {LENGTHS.map((key) => (
                <td key={key} role="cell" data-align="end">
                  <Figure path={`spread.gaps.${row.index}.${key}`} estimate={row[key]} row={row.names} unit="bare" />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
      {shown.length < rows.length && (
        <Button
          look="quiet"
          className="text-small"
          onClick={() => {
            setAll(true);
          }}
        >
          Show all {rows.length}
        </Button>
      )}
      {pairsShort > gaps.length && (
        <p className="text-small text-soft">
          The {gaps.length} with the largest shortfall are listed; the other {pairsShort - gaps.length} are not.
        </p>
      )}
      {[...never].map((why) => (
        <p key={why} className="text-small text-soft">
          Never: {why.charAt(0).toLowerCase() + why.slice(1)}
        </p>
      ))}
    </div>
  );
}

function noneWords(pairs: number): string {
  if (pairs === 0) return 'No two entries on the plan stand within 10 m of each other.';
  return `None of the ${pairs} pairs within 10 m stands nearer than what is enough in this model.`;
}

/** A length that never comes sorts after all others. */
function sortRows(rows: readonly Row[], { key, direction }: Sort): readonly Row[] {
  const turn = direction === 'ascending' ? 1 : -1;
  const length = LENGTHS.find((one) => one === key);
  const valueOf = (row: Row): number => (length === undefined ? 0 : (row[length].value ?? Infinity));
  return rows.toSorted(
    (a, b) => turn * (length === undefined ? a.names.localeCompare(b.names) : valueOf(a) - valueOf(b) || 0),
  );
}
