import type { RoomTally } from '@embertally/shared/tally/room-tally';
import { Figure } from './figure.tsx';
import { FigureNotes } from './figure-notes.tsx';
import { FormulaText } from '../../components/working/formula-text.tsx';
import { plainUnits } from '../../lib/plain-units.ts';
import { FLASHOVER_NAMES, FLASHOVER_WAYS, lowestFlashover } from './lowest-flashover.ts';

/** Flashover three ways, side by side, each with the range it was made for. */
export function FlashoverTable({ flashover }: { readonly flashover: RoomTally['room']['flashover'] }) {
  const present = FLASHOVER_WAYS.filter((way) => flashover[way] !== undefined);
  if (present.length === 0) return null;
  const lowest = lowestFlashover(flashover);
  return (
    <>
      <table className="tally-ledger w-full text-small">
        <caption className="pb-1 text-left text-soft">Heat release at which the room would flash over</caption>
        <thead>
          <tr>
            <th scope="col">After</th>
            <th scope="col" data-align="end">
              Heat release
            </th>
            <th scope="col" data-wide="yes">
              Made for
            </th>
            <th scope="col">Here</th>
          </tr>
        </thead>
        <tbody>
          {present.map((way) => {
            const criterion = flashover[way];
            if (criterion === undefined) return null;
            return (
              <tr key={way}>
                <th scope="row">
                  {FLASHOVER_NAMES[way]}
                  <span className="ledger-under" aria-hidden="true">
                    <FormulaText>{plainUnits(criterion.range)}</FormulaText>
                  </span>
                </th>
                <td data-align="end">
                  <Figure path={`room.flashover.${way}`} estimate={criterion} />
                </td>
                <td data-wide="yes" className="text-soft">
                  <FormulaText>{plainUnits(criterion.range)}</FormulaText>
                </td>
                <td>
                  {criterion.applicable ? (
                    way === lowest?.way ? (
                      <strong>applies, lowest</strong>
                    ) : (
                      'applies'
                    )
                  ) : (
                    <>
                      does not apply
                      {criterion.why !== undefined && (
                        <span className="block text-soft">
                          <FormulaText>{plainUnits(criterion.why)}</FormulaText>
                        </span>
                      )}
                    </>
                  )}
                </td>
              </tr>
            );
          })}
        </tbody>
      </table>
      <p className="mt-2 max-w-[72ch] text-small text-soft">
        They differ because each asks for something else: Thomas for the size of the room and its openings, Babrauskas
        for the openings alone, McCaffrey, Quintiere and Harkleroad also for how much heat the linings take. The lowest
        that applies is used.
      </p>
      <FigureNotes of={present.map((way) => flashover[way])} />
    </>
  );
}
