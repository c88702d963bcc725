import type { SpreadTallyEvent } from '@embertally/shared/tally/room-tally';
import { useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { causeWords } from '../../spread/fire-words.ts';
import type { PlayedFire } from '../../spread/spread-play.ts';
import { useSpreadPlay } from '../../spread/use-spread-play.ts';
import { Figure } from '../figure.tsx';
import { FigureNotes } from '../figure-notes.tsx';

const FIRST = 30;

interface SpreadEventsProps {
  readonly events: readonly SpreadTallyEvent[];
  /** The same events as the plan plays them. */
  readonly fire: PlayedFire;
  readonly nameOf: (id: string) => string;
  /** Shows the fire at a moment on the plan. */
  readonly onShow: (at_s: number) => void;
}

/** The order of ignition. */
export function SpreadEvents({ events, fire, nameOf, onShow }: SpreadEventsProps) {
  const [all, setAll] = useState(false);
  const shown = all || events.length <= FIRST + 5 ? events : events.slice(0, FIRST);
  const now = useSpreadPlay((state) =>
    state.fire === fire ? fire.events.findLastIndex((event) => event.t_s <= state.at_s) : -1,
  );
  return (
    <div>
      <table className="tally-ledger w-full text-small">
        <caption className="pb-1 text-left text-soft">What lights, when and by what</caption>
        <thead>
          <tr>
            <th scope="col" data-align="end">
              <span className="unseen">Order</span>
            </th>
            <th scope="col">Entry</th>
            <th scope="col" data-align="end">
              After
            </th>
            <th scope="col" data-align="end">
              Radiation
            </th>
          </tr>
        </thead>
        <tbody>
          {shown.map((event, index) => {
            const name = event.id === null ? 'The fire goes out' : nameOf(event.id);
            return (
              <tr key={event.id ?? 'room'} className="spread-row" aria-current={index === now ? 'step' : undefined}>
                <td data-align="end" className="figure text-soft">
                  {index + 1}
                </td>
                <th scope="row">
                  <button
                    type="button"
                    className="ledger-entry"
                    aria-label={`${name}: show this moment on the plan`}
                    onClick={() => {
                      onShow(event.t.value ?? 0);
                    }}
                  >
                    {name}
                  </button>
                  <span className="block text-soft">
                    {causeWords({ cause: event.cause, from: event.from ?? null }, nameOf)}
                    {event.nearField === true && ' · near field'}
                  </span>
                </th>
                <td data-align="end">
                  <Figure path={`spread.events.${index}.t`} estimate={event.t} row={name} />
                </td>
                <td data-align="end">
                  {event.flux === undefined ? (
                    <span className="text-soft">–</span>
                  ) : (
                    <Figure path={`spread.events.${index}.flux`} estimate={event.flux} row={name} />
                  )}
                </td>
              </tr>
            );
          })}
        </tbody>
      </table>
      {shown.length < events.length && (
        <Button
          look="quiet"
          className="text-small"
          onClick={() => {
            setAll(true);
          }}
        >
          Show all {events.length}
        </Button>
      )}
      <FigureNotes of={shown.flatMap((event) => [event.t, event.flux])} />
    </div>
  );
}
