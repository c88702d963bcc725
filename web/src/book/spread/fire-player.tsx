import { type ReactNode, useEffect, useId } from 'react';
import { Button } from '../../components/button.tsx';
import { useQuantity } from '../../lib/use-quantity.ts';
import { useBookSession } from '../session/use-book-session.ts';
import { eventWords } from './fire-words.ts';
import { spreadMoment } from './spread-moment.ts';
import { type PlayedFire, SPEEDS } from './spread-play.ts';
import { usePlayer, useSpreadPlay } from './use-spread-play.ts';
import { useStillness } from './use-stillness.ts';

interface FirePlayerProps {
  readonly fire: PlayedFire;
  readonly nameOf: (id: string) => string;
  /** Ends the showing. */
  readonly close: ReactNode;
}

/** Time of the fire on the plan: let it run, stop it, go from event to event, or to any moment. */
export function FirePlayer({ fire, nameOf, close }: FirePlayerProps) {
  const player = usePlayer();
  const session = useBookSession();
  const show = useQuantity();
  const still = useStillness();
  const { at_s, running, speed } = useSpreadPlay((state) => state);
  const slider = useId();
  const speeds = useId();
  const moment = spreadMoment(fire, at_s);
  const time = (s: number): string => {
    if (s < 60) return `${Math.floor(s)} s`;
    const { text, unit } = show(Math.floor(s), 's');
    return `${text} ${unit}`;
  };
  const many = moment.lit.length;
  const alight = many === 1 ? '1 entry alight' : `${many} entries alight`;
  const happened = moment.latest === null ? '' : eventWords(moment.latest, nameOf);
  const spoken = `${time(moment.latest?.t_s ?? 0)}: ${happened}. ${alight}.`;

  useEffect(() => {
    session.announce(spoken);
  }, [session, spoken]);

  return (
    <>
      <div className="spread-now">
        <span className="figure spread-time">{time(at_s)}</span>
        <span className="spread-words">
          {happened}
          {moment.flashedOver ? ' · the room has flashed over' : ''} · {alight}
        </span>
        {close}
      </div>
      <label htmlFor={slider} className="unseen">
        Time since the first entry burns
      </label>
      <input
        id={slider}
        type="range"
        className="spread-slider"
        min={0}
        max={fire.end_s}
        step="any"
        value={at_s}
        aria-valuetext={`${time(at_s)}, ${alight}`}
        onChange={(event) => {
          player.pause();
          player.seek(Number(event.currentTarget.value));
        }}
        onKeyDown={(event) => {
          // A press of an arrow is one second, whatever the length of the fire.
          const by = { ArrowRight: 1, ArrowUp: 1, ArrowLeft: -1, ArrowDown: -1, PageUp: 10, PageDown: -10 }[event.key];
          if (by === undefined) return;
          event.preventDefault();
          player.pause();
          player.seek(at_s + by);
        }}
      />
      <div className="spread-verbs">
        {!still && (
          <Button
            size="small"
            look="primary"
            onClick={() => {
              if (running) player.pause();
              else player.run();
            }}
          >
            {running ? 'Pause' : 'Play'}
          </Button>
        )}
        <Button
          size="small"
          onClick={() => {
            player.step('back');
          }}
        >
          Back
          <span className="unseen"> to the event before</span>
        </Button>
        <Button
          size="small"
          onClick={() => {
            player.step('on');
          }}
        >
          On
          <span className="unseen"> to the next event</span>
        </Button>
        {!still && (
          <label htmlFor={speeds} className="spread-speed">
            <span className="text-soft">Speed</span>
            <select
              id={speeds}
              value={speed}
              onChange={(event) => {
                player.setSpeed(Number(event.currentTarget.value));
              }}
            >
              {SPEEDS.map((times) => (
                <option key={times} value={times}>
                  {times === 1 ? 'as it is' : `${times} times`}
                </option>
              ))}
            </select>
          </label>
        )}
        <ul className="spread-legend" aria-label="What the marks mean">
          <li>
            <span className="fire-swatch" data-stage="just lit" aria-hidden="true" /> just lit
          </li>
          <li>
            <span className="fire-swatch" data-stage="burning" aria-hidden="true" /> burning
          </li>
          <li>
            <span className="fire-swatch" data-stage="next" aria-hidden="true" /> next
          </li>
        </ul>
      </div>
    </>
  );
}
