import type { Estimate } from '@embertally/shared/methods/estimate';
import type { BurnoutCase, RoomTally } from '@embertally/shared/tally/room-tally';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { StandingMark } from '../../components/standing-mark.tsx';
import { Figure } from './figure.tsx';
import { FigureNotes } from './figure-notes.tsx';

const ROWS: readonly {
  readonly label: string;
  readonly path: string;
  readonly of: (burnout: BurnoutCase) => Estimate | undefined;
}[] = [
  { label: 'Load per enclosing surface', path: 'loadPerEnclosure', of: (burnout) => burnout.loadPerEnclosure },
  { label: 'Peak temperature', path: 'parametric.peak', of: (burnout) => burnout.parametric?.peak },
  { label: 'Peak reached after', path: 'parametric.timeOfPeak', of: (burnout) => burnout.parametric?.timeOfPeak },
  { label: 'Equivalent time of exposure', path: 'equivalentTime', of: (burnout) => burnout.equivalentTime },
];

interface BurnoutTableProps {
  /** Of the section, or the same before any glass breaks. */
  readonly burnout: Pick<RoomTally['burnout'], 'asKept' | 'design'>;
  /** Path of `burnout` in the tally. */
  readonly path: 'burnout' | 'burnout.beforeGlass';
  readonly caption: string;
  readonly rating_min: number | null;
}

/** The burn-out twice: for the heat as kept, which comes first, and for the design load. */
export function BurnoutTable({ burnout, path, caption, rating_min }: BurnoutTableProps) {
  const { asKept, design } = burnout;
  const rows = ROWS.filter((row) => (asKept && row.of(asKept)) ?? (design && row.of(design)));
  if (rows.length === 0) return null;
  const cell = (name: 'asKept' | 'design', burnoutCase: BurnoutCase | undefined, row: (typeof ROWS)[number]) => {
    const estimate = burnoutCase && row.of(burnoutCase);
    return (
      <td data-align="end">
        {estimate === undefined ? (
          <span className="text-soft">–</span>
        ) : (
          <Figure path={`${path}.${name}.${row.path}`} estimate={estimate} />
        )}
      </td>
    );
  };
  const standing = (burnoutCase: BurnoutCase | undefined) => (
    <td data-align="end">
      {burnoutCase?.standing === undefined || rating_min === null ? (
        <span className="text-soft">–</span>
      ) : (
        <StandingMark standing={burnoutCase.standing} />
      )}
    </td>
  );
  const rating = rating_min === null ? null : formatQuantity(rating_min, 'min', 'SI', { figures: 'as entered' });
  return (
    <>
      <table className="tally-ledger w-full text-small">
        <caption className="pb-1 text-left text-soft">{caption}</caption>
        <thead>
          <tr>
            <th scope="col">
              <span className="unseen">Quantity</span>
            </th>
            <th scope="col" data-align="end">
              As kept
            </th>
            <th scope="col" data-align="end">
              Design load
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.path}>
              <th scope="row">{row.label}</th>
              {cell('asKept', asKept, row)}
              {cell('design', design, row)}
            </tr>
          ))}
          <tr>
            <th scope="row">
              {rating === null
                ? 'Against the rated resistance: none recorded'
                : `Against the rated ${rating.text} ${rating.unit}`}
            </th>
            {standing(asKept)}
            {standing(design)}
          </tr>
        </tbody>
      </table>
      <FigureNotes of={rows.flatMap((row) => [asKept && row.of(asKept), design && row.of(design)])} />
    </>
  );
}
