import type { Estimate } from '@embertally/shared/methods/estimate';
import { displayUnit } from '@embertally/shared/units/display-unit';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { useState } from 'react';
import { Button } from '../../components/button.tsx';
import { useUnits } from '../../lib/units-context.ts';
import { EVIDENCE_WORDS, KEEPING_WORDS } from './entry-words.ts';
import { Figure } from './figure.tsx';
import type { LedgerRow } from './ledger-rows.ts';
import { useQuantity } from '../../lib/use-quantity.ts';

const FIRST = 60;

interface ContentsLedgerProps {
  readonly rows: readonly LedgerRow[];
  readonly total: Estimate;
  /** Picks an entry on the plan; absent where there is no plan. */
  readonly onPick?: (entryId: string) => void;
}

/** The contents as a ledger: one line per entry with the sum so far, ruled off by the heat kept in the room. */
export function ContentsLedger({ rows, total, onPick }: ContentsLedgerProps) {
  const units = useUnits();
  const show = useQuantity();
  const [all, setAll] = useState(false);
  const shown = all || rows.length <= FIRST + 10 ? rows : rows.slice(0, FIRST);
  const heatUnit = displayUnit('MJ', units)?.symbol ?? 'MJ';
  return (
    <>
      <table className="tally-ledger mt-3 w-full text-small">
        <caption className="unseen">Contents of the room, one line per entry, with a running sum</caption>
        <thead>
          <tr>
            <th scope="col">Entry</th>
            <th scope="col" data-align="end" data-wide="yes">
              Quantity
            </th>
            <th scope="col" data-wide="yes">
              Kept
            </th>
            <th scope="col" data-wide="yes">
              How known
            </th>
            <th scope="col" data-align="end">
              {heatUnit}
            </th>
            <th scope="col" data-align="end">
              Running
            </th>
          </tr>
        </thead>
        <tbody>
          {shown.map((row) => {
            const mass = formatQuantity(row.mass_kg, 'kg', units, { figures: 'as entered' });
            const quantity = `${row.count === 1 ? '' : `${formatCount(row.count)} × `}${mass.text} ${mass.unit}`;
            return (
              <tr key={row.id}>
                <th scope="row">
                  {onPick === undefined ? (
                    row.label
                  ) : (
                    <button
                      type="button"
                      className="ledger-entry"
                      onClick={() => {
                        onPick(row.id);
                      }}
                    >
                      {row.label}
                    </button>
                  )}
                  <span className="ledger-under" aria-hidden="true">
                    {quantity} · {KEEPING_WORDS[row.keeping]} · {EVIDENCE_WORDS[row.evidence]}
                  </span>
                </th>
                <td data-align="end" data-wide="yes">
                  <span className="figure">
                    {row.count === 1 ? '' : `${formatCount(row.count)} × `}
                    {mass.text}
                  </span>{' '}
                  <span className="text-soft">{mass.unit}</span>
                </td>
                <td data-wide="yes">{KEEPING_WORDS[row.keeping]}</td>
                <td data-wide="yes">
                  <span className="evidence" data-evidence={row.evidence}>
                    {EVIDENCE_WORDS[row.evidence]}
                  </span>
                </td>
                <td data-align="end">
                  <Figure path={row.path} estimate={row.heat} row={row.label} unit="bare" />
                </td>
                <td data-align="end" className="figure text-soft">
                  {show(row.running_MJ, 'MJ').text}
                </td>
              </tr>
            );
          })}
        </tbody>
        <tfoot>
          <tr>
            <th scope="row">Heat kept in this room</th>
            <td data-wide="yes" colSpan={3} />
            <td data-align="end" colSpan={2}>
              <Figure path="load.total" estimate={total} className="font-bold" />
            </td>
          </tr>
        </tfoot>
      </table>
      {shown.length < rows.length && (
        <Button
          look="quiet"
          onClick={() => {
            setAll(true);
          }}
        >
          Show all {rows.length} entries
        </Button>
      )}
    </>
  );
}

const formatCount = (count: number): string => count.toLocaleString('en-GB').replaceAll(',', '\u202f');
